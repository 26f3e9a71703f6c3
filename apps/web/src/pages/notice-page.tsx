import { useParams } from 'react-router-dom';
import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { Loading } from '../components/states/loading';
import { useNotice } from '../features/notices/api';
import { NoticeView } from '../features/notices/components/notice-view';
import { useZone } from '../lib/api/use-districts';
import { useMe } from '../lib/api/use-me';
import { KIND_NAME } from '../lib/words';

/** One notice: what it said, to whom it went, what became of it. */
export function NoticePage() {
  const id = Number(useParams().id);
  const notice = useNotice(id);
  const zone = useZone(notice.data?.districtId);
  const { me } = useMe();
  const title = notice.data ? `${KIND_NAME[notice.data.kind]}, ${notice.data.districtName}` : 'Notice';
  return (
    <>
      <PageHead title={title} aside={notice.data?.ref} />
      <Loaded
        from={notice}
        what="the notice"
        loading={<Loading label="the notice" rows={4} rowHeight="28" />}
      >
        {(data) =>
          me && <NoticeView notice={data} me={me} zone={zone} onAnswer={() => void notice.mutate()} />
        }
      </Loaded>
    </>
  );
}

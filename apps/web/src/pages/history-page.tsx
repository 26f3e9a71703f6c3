import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { Loading } from '../components/states/loading';
import { HistoryView } from '../features/history/components/history-view';
import { useDistricts } from '../lib/api/use-districts';

/** The dashboard: how strong inversions were, and the profile now. */
export function HistoryPage() {
  const districts = useDistricts();
  return (
    <>
      <PageHead title="History" />
      <Loaded
        from={districts}
        what="the districts"
        loading={<Loading label="the history" rows={1} rowHeight="420px" />}
      >
        {(data) => <HistoryView districts={data} />}
      </Loaded>
    </>
  );
}

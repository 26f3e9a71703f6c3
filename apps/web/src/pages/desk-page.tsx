import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { Loading } from '../components/states/loading';
import { useDesk } from '../features/desk/api';
import { DeskView } from '../features/desk/components/desk-view';
import { TowerLine } from '../features/desk/components/tower-line';
import { partOfDay } from '../features/desk/part-of-day';
import { useNow } from '../lib/clock';
import { dayAndTime } from '../lib/format/time';

/** The analyst's desk. */
export function DeskPage() {
  const desk = useDesk();
  const now = useNow();
  const zone = desk.data?.districts[0]?.timeZone ?? 'UTC';
  return (
    <>
      <PageHead
        title={desk.data ? partOfDay(now, zone) : 'Desk'}
        aside={
          desk.data && (
            <>
              {dayAndTime(now, zone)} · <TowerLine towers={desk.data.towers} />
            </>
          )
        }
      />
      <Loaded
        from={desk}
        what="the desk"
        since={({ at }) => at}
        loading={<Loading label="the desk" rows={6} rowHeight="20" />}
      >
        {(data) => <DeskView desk={data} />}
      </Loaded>
    </>
  );
}

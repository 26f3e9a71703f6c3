import { Stack } from '@chakra-ui/react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Loading } from '../../../components/states/loading';
import { Button } from '../../../components/ui/button';
import { Pager } from '../../../components/ui/pager';
import { useDistricts } from '../../../lib/api/use-districts';
import { useNotices } from '../api';
import { useNoticeFilter } from '../use-notice-filter';
import { NoticeFilterBar } from './notice-filter-bar';
import { NoticeTable } from './notice-table';

/** The notice log: what was in force where, when and by whom, narrowed by a filter that stands in the address. */
export function NoticeLog() {
  const { data: districts } = useDistricts();
  const zone = districts?.[0]?.timeZone ?? 'UTC';
  const { field, filter, page, filtered, change, reset } = useNoticeFilter(zone);
  const notices = useNotices(filter);
  return (
    <Stack gap="4">
      <NoticeFilterBar districts={districts ?? []} field={field} onChange={change} />
      <Loaded
        from={notices}
        what="the notices"
        loading={<Loading label="the notices" rows={8} rowHeight="11" />}
      >
        {({ items, total, pageSize }) =>
          items.length === 0 ? (
            <Empty title={filtered ? 'No notice matches' : 'No notice yet'}>
              {filtered ? (
                <Button size="sm" mt="2" onClick={reset}>
                  Show all
                </Button>
              ) : (
                'A notice appears here as soon as an officer issues it.'
              )}
            </Empty>
          ) : (
            <>
              <NoticeTable
                notices={items}
                zoneOf={(id) => districts?.find((d) => d.id === id)?.timeZone ?? zone}
              />
              <Pager
                page={page}
                pageSize={pageSize}
                total={total}
                what="notice"
                onPage={(to) => change({ page: to > 1 ? String(to) : '' })}
              />
            </>
          )
        }
      </Loaded>
    </Stack>
  );
}

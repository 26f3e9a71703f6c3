import { useSearchParams } from 'react-router-dom';
import { fromZonedInput } from '../../lib/format/zoned-input';
import type { NoticeFilter } from './api';

/** The filter as it stands in the address: what the fields hold, so that a link shows the same list. */
export const FILTER_FIELDS = ['district', 'kind', 'state', 'from', 'to', 'words'] as const;
/** The name of a field of the filter. */
export type FilterField = (typeof FILTER_FIELDS)[number];

/** The log's filter and page, kept in the address. Dates are days in the zone, both included. */
export function useNoticeFilter(zone: string) {
  const [search, setSearch] = useSearchParams();
  const field = (name: FilterField) => search.get(name) ?? '';
  const page = Math.max(1, Number(search.get('page')) || 1);
  const day = (name: 'from' | 'to') => fromZonedInput(field(name), zone);
  const to = day('to');
  const filter: NoticeFilter = {
    districtId: field('district'),
    kind: field('kind'),
    state: field('state'),
    from: day('from') ?? undefined,
    to: to ? new Date(new Date(to).getTime() + 86_400_000).toISOString() : undefined,
    q: field('words'),
    page,
    pageSize: 25,
  };
  const change = (changes: Partial<Record<FilterField | 'page', string>>) =>
    setSearch(
      (before) => {
        const after = new URLSearchParams(before);
        if (!('page' in changes)) after.delete('page');
        for (const [name, value] of Object.entries(changes)) {
          if (value) after.set(name, value);
          else after.delete(name);
        }
        return after;
      },
      { replace: true },
    );
  const filtered = FILTER_FIELDS.some((name) => field(name) !== '');
  return { field, filter, page, filtered, change, reset: () => setSearch({}, { replace: true }) };
}

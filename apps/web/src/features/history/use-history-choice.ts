import { useSearchParams } from 'react-router-dom';
import { SPANS, type SpanName } from './spans';

/** What the history page shows, kept in the address: the district's slug, the span, the dates. */
export function useHistoryChoice() {
  const [search, setSearch] = useSearchParams();
  const named = search.get('span');
  const name: SpanName = SPANS.find((span) => span.name === named)?.name ?? 'nights';
  const change = (changes: Record<string, string>) =>
    setSearch(
      (before) => {
        const after = new URLSearchParams(before);
        for (const [key, value] of Object.entries(changes)) {
          if (value) after.set(key, value);
          else after.delete(key);
        }
        return after;
      },
      { replace: true },
    );
  return {
    slug: search.get('district'),
    name,
    from: search.get('from') ?? '',
    to: search.get('to') ?? '',
    change,
  };
}

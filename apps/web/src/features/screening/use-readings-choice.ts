import { useSearchParams } from 'react-router-dom';
import { dayIn, isDay } from './days';
import type { SeenSensor } from './types';

/** Spans of the chart, in days. */
export const SPANS = [
  { days: 1, label: 'Day' },
  { days: 3, label: '3 days' },
  { days: 7, label: 'Week' },
  { days: 31, label: 'Month' },
] as const;

/** What the page shows, kept in the address: the last day, how many days, which quantity. */
export interface ReadingsChoice {
  day: string;
  today: string;
  days: number;
  quantity: SeenSensor['quantity'];
  change: (changes: { day?: string; days?: number; quantity?: string }) => void;
}

/** The choice of the page in a zone; today and air temperature where nothing is chosen. */
export function useReadingsChoice(zone: string, nowMs: number): ReadingsChoice {
  const [search, setSearch] = useSearchParams();
  const today = dayIn(nowMs, zone);
  const asked = search.get('day') ?? '';
  const days = SPANS.find((span) => String(span.days) === search.get('days'))?.days ?? 1;
  return {
    ...{ today, days },
    day: isDay(asked) && asked < today ? asked : today,
    quantity: (search.get('quantity') ?? 'air temperature') as SeenSensor['quantity'],
    change: (changes) =>
      setSearch(
        (before) => {
          const after = new URLSearchParams(before);
          for (const [key, value] of Object.entries(changes)) after.set(key, String(value));
          if (after.get('day') === today) after.delete('day');
          return after;
        },
        { replace: true, preventScrollReset: true },
      ),
  };
}

import { clockTime } from '../../lib/format/time';

const PARTS: [untilHour: number, name: string][] = [
  [5, 'night'],
  [12, 'morning'],
  [17, 'afternoon'],
  [21, 'evening'],
  [24, 'night'],
];

/**
 * What the desk is called now: "Wednesday night". After midnight it is still the night of the day before, as people
 * say it.
 */
export function partOfDay(nowMs: number, zone: string): string {
  const hour = Number(clockTime(nowMs, zone).slice(0, 2));
  const day = new Date(hour < 5 ? nowMs - 6 * 3_600_000 : nowMs);
  const weekday = day.toLocaleDateString('en-US', { weekday: 'long', timeZone: zone });
  return `${weekday} ${PARTS.find(([until]) => hour < until)?.[1] ?? 'night'}`;
}

import { fromZonedInput } from '../../lib/format/zoned-input';

/** A span that can be chosen, by name. */
export type SpanName = 'nights' | 'week' | 'month' | 'season' | 'dates';

/** The spans in the order in which they are offered. */
export const SPANS: readonly { name: SpanName; label: string; days?: number }[] = [
  { name: 'nights', label: 'Last two nights', days: 2 },
  { name: 'week', label: 'Week', days: 7 },
  { name: 'month', label: 'Month', days: 31 },
  { name: 'season', label: 'Season', days: 182 },
  { name: 'dates', label: 'Dates…' },
];

const DAY_MS = 86_400_000;
const STEP_MS = 15 * 60_000;

/** The ends of a span as ISO 8601; null while the dates are incomplete or the wrong way round. */
export function spanEnds(
  { name, from, to }: { name: SpanName; from: string; to: string },
  nowMs: number,
  zone: string,
): { from: string; to: string } | null {
  const days = SPANS.find((span) => span.name === name)?.days;
  if (days !== undefined) {
    const end = Math.ceil(nowMs / STEP_MS) * STEP_MS;
    return { from: new Date(end - days * DAY_MS).toISOString(), to: new Date(end).toISOString() };
  }
  const [first, last] = [fromZonedInput(from, zone), fromZonedInput(to, zone)];
  if (!first || !last || first > last) return null;
  return { from: first, to: new Date(new Date(last).getTime() + DAY_MS).toISOString() };
}

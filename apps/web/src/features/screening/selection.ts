import { fromZonedInput, toZonedInput } from '../../lib/format/zoned-input';

/** A span of one sensor as it is chosen: the fields' texts in the tower's zone, ends of the first and last reading. */
export interface Selection {
  sensorId: number | undefined;
  from: string;
  to: string;
}

/** Nothing is chosen. */
export const NOTHING: Selection = { sensorId: undefined, from: '', to: '' };

/** A chosen span as instants, ISO 8601 in UTC; null while it is incomplete or ends before it begins. */
export function selectedEnds({ from, to }: Selection, zone: string): { from: string; to: string } | null {
  const [first, last] = [fromZonedInput(from, zone), fromZonedInput(to, zone)];
  return first && last && first <= last ? { from: first, to: last } : null;
}

/** A span given by instants as the fields hold it. */
export const selectionOf = (
  sensorId: number,
  { from, to }: { from: string | number; to: string | number },
  zone: string,
): Selection => ({ sensorId, from: toZonedInput(from, zone), to: toZonedInput(to, zone) });

/** The readings within a stretch that was drawn by hand: whole intervals inside it; null for a mere click. */
export function snapped(a: number, b: number, intervalMinutes: number): { from: number; to: number } | null {
  const step = intervalMinutes * 60_000;
  const from = Math.ceil(Math.min(a, b) / step) * step;
  const to = Math.floor(Math.max(a, b) / step) * step;
  return to < from ? null : { from, to };
}

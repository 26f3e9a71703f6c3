import { tzOffset } from '@date-fns/tz';

const MINUTE_S = 60;

/** So many offsets are remembered; to ask the system's calendar for one costs as much as a district's block. */
const MOST_KEPT = 20_000;
const kept = new Map<string, number>();

/** Offset of a zone (IANA name) from UTC at an instant (UTC epoch seconds), s. */
export function zoneOffsetS(timeZone: string, t: number): number {
  const key = `${t} ${timeZone}`;
  const known = kept.get(key);
  if (known !== undefined) return known;
  const offset = tzOffset(timeZone, new Date(t * 1000)) * MINUTE_S;
  if (kept.size >= MOST_KEPT) kept.clear();
  kept.set(key, offset);
  return offset;
}

import { clockTime, dayAndTime, dayOf, duration } from '../../../lib/format/time';

interface SpanTextProps {
  span: { from: string; to: string };
  zone: string;
}

const utc = (instant: string): string => dayAndTime(instant, 'UTC');

/** "Sat 28 Nov, 03:10 to 06:40 (3 h 30)" in the zone; in UTC as the tooltip. */
export function SpanText({ span: { from, to }, zone }: SpanTextProps) {
  const minutes = (Date.parse(to) - Date.parse(from)) / 60_000;
  const sameDay = dayOf(from, zone) === dayOf(to, zone);
  const begin = dayAndTime(from, zone, { zoneName: minutes === 0 });
  const end = sameDay ? clockTime(to, zone) : dayAndTime(to, zone, { zoneName: false });
  return (
    <span title={`${utc(from)} to ${utc(to)}`}>
      {begin}
      {minutes > 0 && ` to ${end} (${duration(minutes)})`}
    </span>
  );
}

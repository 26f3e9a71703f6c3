import { ago, dayAndTime, weekdayAndTime } from '../../lib/format/time';
import { useNow } from '../../lib/clock';

interface TimeProps {
  at: string;
  /** The district's zone (IANA name). */
  zone: string;
}

/** "4 min ago", renewed as time passes; the instant itself is the tooltip and stands in `datetime`. */
export function AgoText({ at, zone }: TimeProps) {
  const now = useNow();
  return (
    <time dateTime={at} title={dayAndTime(at, zone)}>
      {ago(at, now)}
    </time>
  );
}

/** "Thu 11:00" while it is near, "15 Jan 11:00" further away; the full instant with its zone is the tooltip. */
export function InstantText({ at, zone }: TimeProps) {
  const now = useNow();
  return (
    <time dateTime={at} title={dayAndTime(at, zone)}>
      {weekdayAndTime(at, zone, now)}
    </time>
  );
}

/** "Thu 15 Jan, 02:00 MST · 4 min ago": the instant with its zone, and how long ago beside it. */
export function TimeText({ at, zone }: TimeProps) {
  const now = useNow();
  return (
    <time dateTime={at}>
      {dayAndTime(at, zone)} · {ago(at, now)}
    </time>
  );
}

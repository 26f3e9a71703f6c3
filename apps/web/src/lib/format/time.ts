const formats = new Map<string, Intl.DateTimeFormat>();

function format(zone: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = zone + JSON.stringify(options);
  const known = formats.get(key);
  if (known) return known;
  const made = new Intl.DateTimeFormat('en-US', { timeZone: zone, hourCycle: 'h23', ...options });
  formats.set(key, made);
  return made;
}

function parts(instant: Date, zone: string): Record<string, string> {
  const all = format(zone, {
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    timeZoneName: 'short',
  }).formatToParts(instant);
  return Object.fromEntries(all.map(({ type, value }) => [type, value]));
}

/** An instant as the API or a clock gives it. */
export type Instant = string | number;

/** "02:00" in the zone. */
export function clockTime(instant: Instant, zone: string): string {
  const { hour, minute } = parts(new Date(instant), zone);
  return `${hour}:${minute}`;
}

/** "Thu 15 Jan" in the zone. */
export function dayOf(instant: Instant, zone: string): string {
  const { weekday, day, month } = parts(new Date(instant), zone);
  return `${weekday} ${day} ${month}`;
}

/** "Thu 15 Jan, 02:00 MST": day, time and the zone's name. */
export function dayAndTime(instant: Instant, zone: string, { zoneName = true } = {}): string {
  const { weekday, day, month, hour, minute, timeZoneName } = parts(new Date(instant), zone);
  return `${weekday} ${day} ${month}, ${hour}:${minute}${zoneName ? ` ${timeZoneName}` : ''}`;
}

/** "15 Jan 2026, 02:00 MST": for records, where the year counts. */
export function dateAndTime(instant: Instant, zone: string): string {
  const { day, month, year, hour, minute, timeZoneName } = parts(new Date(instant), zone);
  return `${day} ${month} ${year}, ${hour}:${minute} ${timeZoneName}`;
}

/** "Thu 11:00": within a few days the weekday says enough; further away the date. */
export function weekdayAndTime(instant: Instant, zone: string, nowMs: number): string {
  const at = new Date(instant);
  const { weekday, day, month, hour, minute } = parts(at, zone);
  const near = Math.abs(at.getTime() - nowMs) < 6 * 86_400_000;
  return near ? `${weekday} ${hour}:${minute}` : `${day} ${month} ${hour}:${minute}`;
}

/** "4 min ago", "2 h ago", "3 days ago"; "just now" under a minute; "in 20 min" ahead. */
export function ago(instant: Instant, nowMs: number): string {
  const minutes = Math.round((nowMs - new Date(instant).getTime()) / 60_000);
  if (minutes === 0) return 'just now';
  const span = roughSpan(Math.abs(minutes));
  return minutes > 0 ? `${span} ago` : `in ${span}`;
}

function roughSpan(minutes: number): string {
  if (minutes < 100) return `${minutes} min`;
  if (minutes < 48 * 60) return `${Math.round(minutes / 60)} h`;
  return `${Math.round(minutes / 1440)} days`;
}

/** A length of time as the trade says it: "45 min", "9 h 40", "2 days 3 h". */
export function duration(minutes: number): string {
  const whole = Math.round(minutes);
  const [days, hours, rest] = [Math.floor(whole / 1440), Math.floor((whole % 1440) / 60), whole % 60];
  if (days > 0) return `${days} ${days === 1 ? 'day' : 'days'}${hours > 0 ? ` ${hours} h` : ''}`;
  if (hours > 0) return `${hours} h${rest > 0 ? ` ${String(rest).padStart(2, '0')}` : ''}`;
  return `${rest} min`;
}

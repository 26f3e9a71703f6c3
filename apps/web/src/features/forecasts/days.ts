const DAY_MS = 86_400_000;
const NOON = 12;

/** A day so many days later, days as 2026-01-31. */
export const addDays = (day: string, days: number): string =>
  new Date(Date.parse(`${day}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);

/** The zone's local day of an instant, and its hour. */
function localParts(nowMs: number, zone: string): { day: string; hour: number } {
  const parts = new Intl.DateTimeFormat('en-CA', {
    timeZone: zone,
    hourCycle: 'h23',
    ...{ year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit' },
  }).formatToParts(nowMs);
  const of = (type: string): string => parts.find((part) => part.type === type)?.value ?? '';
  return { day: `${of('year')}-${of('month')}-${of('day')}`, hour: Number(of('hour')) };
}

/** The day whose night a forecast entered now is for: until noon that is still last night. */
export function nightAtHand(nowMs: number, zone: string): string {
  const { day, hour } = localParts(nowMs, zone);
  return hour < NOON ? addDays(day, -1) : day;
}

/** The zone's local day. */
export const today = (nowMs: number, zone: string): string => localParts(nowMs, zone).day;

const shown = (day: string): string => {
  const parts = new Intl.DateTimeFormat('en-US', {
    timeZone: 'UTC',
    ...{ weekday: 'short', day: 'numeric', month: 'short' },
  }).formatToParts(Date.parse(`${day}T12:00:00Z`));
  const of = (type: string): string => parts.find((part) => part.type === type)?.value ?? '';
  return `${of('weekday')} ${of('day')} ${of('month')}`;
};

/** "Thu 15 to Fri 16 Jan" as "Thu 15 Jan to Fri 16 Jan": the night that begins on a day. */
export const nightInWords = (day: string): string => `${shown(day)} to ${shown(addDays(day, 1))}`;

/** "Fri 16 Jan": the day after the night that begins on a day. */
export const dayAfterInWords = (day: string): string => shown(addDays(day, 1));

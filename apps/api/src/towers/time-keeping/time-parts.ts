/** What one of several columns says of the time. `hhmm` is 930 or 0930 for 09:30; 2400 is the day's last midnight. */
export const timeParts = [
  'date',
  'time',
  'year',
  'two-digit year',
  'month',
  'day',
  'day of year',
  'hour',
  'minute',
  'hhmm',
] as const;
/** One of the parts of a time. */
export type TimePart = (typeof timeParts)[number];

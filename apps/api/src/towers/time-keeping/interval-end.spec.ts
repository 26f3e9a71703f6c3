import { endOfInterval, intervalEnd, type TimeKeeping } from './interval-end';
import { readClock } from './logger-clock';
import { readStamp } from './stamp';

const iso = (text: string): number => Date.parse(text) / 1000;
const NOW = iso('2026-12-01T00:00:00Z');
const keeping = (clock: string, changes: Partial<TimeKeeping> = {}): TimeKeeping => ({
  clock: readClock(clock)!,
  stamp: 'end',
  form: 'iso',
  intervalS: 600,
  ...changes,
});

const INSTANTS: readonly (readonly [string, string, string])[] = [
  ['UTC', '2026-01-10 05:00:00', '2026-01-10T05:00:00Z'],
  ['UTC', '2026-01-10T05:00', '2026-01-10T05:00:00Z'],
  ['UTC', '2026/1/9 5:00', '2026-01-09T05:00:00Z'],
  ['UTC', '20260110T0500', '2026-01-10T05:00:00Z'],
  ['UTC', '2026-01-10 24:00', '2026-01-11T00:00:00Z'],
  ['UTC', '2026-01-10 05:00:00.000', '2026-01-10T05:00:00Z'],
  ['UTC', '2026-01-10 04:59:59.9', '2026-01-10T05:00:00Z'],
  ['-07:00', '2026-01-09 22:00:00', '2026-01-10T05:00:00Z'],
  ['-07:00', '2026-01-10 05:00:00Z', '2026-01-10T05:00:00Z'],
  ['UTC', '2026-01-09 22:00:00-07:00', '2026-01-10T05:00:00Z'],
  ['UTC', '2026-01-09 22:00:00 -0700', '2026-01-10T05:00:00Z'],
  ['America/Denver', '2026-01-09 22:00:00', '2026-01-10T05:00:00Z'],
  ['America/Denver', '2026-07-09 23:00:00', '2026-07-10T05:00:00Z'],
  ['America/Denver', '2026-03-08 01:59:59', '2026-03-08T08:59:59Z'],
  ['America/Denver', '2026-03-08 03:00:00', '2026-03-08T09:00:00Z'],
  ['America/Denver', '2026-11-01 00:59:59', '2026-11-01T06:59:59Z'],
  ['America/Denver', '2026-11-01 02:00:00', '2026-11-01T09:00:00Z'],
  ['Asia/Kathmandu', '2026-01-10 10:45:00', '2026-01-10T05:00:00Z'],
];

const REFUSED: readonly (readonly [string, string, string])[] = [
  ['America/Denver', '2026-03-08 02:30:00', 'time-does-not-exist'],
  ['America/Denver', '2026-11-01 01:30:00', 'time-happens-twice'],
  ['UTC', '2026-02-29 05:00', 'time-not-readable'],
  ['UTC', '2026-01-10', 'time-not-readable'],
  ['UTC', '10/01/2026 05:00', 'time-not-readable'],
  ['UTC', '2026-01-10 05:60', 'time-not-readable'],
  ['UTC', '2026-01-10 24:01', 'time-not-readable'],
  ['UTC', '2026-01-10 05:00 +25:00', 'time-not-readable'],
  ['UTC', '2026-01-10 05:00 +14:30', 'time-not-readable'],
  ['UTC', '1899-12-30 00:00', 'time-not-plausible'],
  ['UTC', '2026-12-02 00:01', 'time-ahead'],
  ['UTC', '2026-12-01 00:16', 'time-ahead'],
];

describe('the end of the interval a stamp marks', () => {
  it.each(INSTANTS)('on a clock of %s reads %s as %s', (clock, text, wanted) => {
    expect(intervalEnd(text, keeping(clock), NOW)).toBe(iso(wanted));
  });

  it.each(REFUSED)('on a clock of %s refuses %s as %s, with the cure', (clock, text, code) => {
    const refused = intervalEnd(text, keeping(clock), NOW);
    expect(refused).toMatchObject({ code });
    expect((refused as { why: string }).why).toMatch(/;.+\.$/);
  });

  it('takes an offset in the stamp even in the hour that happens twice', () => {
    const time = keeping('America/Denver');
    expect(intervalEnd('2026-11-01 01:30:00-06:00', time, NOW)).toBe(iso('2026-11-01T07:30:00Z'));
    expect(intervalEnd('2026-11-01 01:30:00-07:00', time, NOW)).toBe(iso('2026-11-01T08:30:00Z'));
  });

  it('moves a stamp that marks the start or the middle to the end', () => {
    const ends = (['instant', 'start', 'middle', 'end'] as const).map((stamp) =>
      endOfInterval(0, stamp, 3600),
    );
    expect(ends).toEqual([0, 3600, 1800, 0]);
  });

  it('reads the declared order of day and month, and no other', () => {
    expect(readStamp('09/01/2026 05:00', 'day/month/year')).toEqual({ shownS: iso('2026-01-09T05:00:00Z') });
    expect(readStamp('09/01/2026 12:30 AM', 'month/day/year')).toEqual({
      shownS: iso('2026-09-01T00:30:00Z'),
    });
    expect(readStamp('25/01/2026 05:00', 'month/day/year')).toMatchObject({ code: 'time-not-readable' });
    expect(readStamp('1796083200', 'epoch-seconds')).toEqual({ shownS: 1796083200, offsetS: 0 });
  });

  it('knows clocks by UTC, offset and zone only', () => {
    expect(readClock('+05:30')).toEqual({ offsetS: 19_800 });
    expect(readClock('America/Denver')).toEqual({ zone: 'America/Denver' });
    for (const text of ['', 'MST', 'Mountain', 'America/Nowhere', '-7', '+19:00']) {
      expect({ text, clock: readClock(text) }).toEqual({ text, clock: undefined });
    }
  });
});

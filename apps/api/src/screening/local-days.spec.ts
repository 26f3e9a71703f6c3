import { daysFromTo, localDays } from './local-days';

test.each([
  ['an ordinary day', '2026-01-15', 24],
  ['the day that clocks go forward', '2026-03-08', 23],
  ['the day that clocks go back', '2026-11-01', 25],
])('%s in Denver has its hours', (_, day, hours) => {
  const [only] = localDays(day, day, 'America/Denver');
  expect((only!.to - only!.from) / 3600).toBe(hours);
});

test('days follow each other without a gap, in UTC too', () => {
  const days = localDays('2026-10-30', '2026-11-03', 'America/Denver');
  expect(days.map(({ day }) => day)).toEqual([
    ...['2026-10-30', '2026-10-31', '2026-11-01', '2026-11-02', '2026-11-03'],
  ]);
  days.slice(1).forEach((day, i) => expect(day.from).toBe(days[i]!.to));
  expect(localDays('2026-01-01', '2026-01-01', 'UTC')[0]!.from).toBe(Date.UTC(2026, 0, 1) / 1000);
});

test.each([
  ['2026-02-28', '2026-03-01', 2],
  ['2026-02-30', '2026-03-01', NaN],
  ['2026-13-01', '2026-13-02', NaN],
  ['2026-03-02', '2026-03-01', 0],
])('from %s to %s are %d days', (from, to, days) => expect(daysFromTo(from, to)).toBe(days));

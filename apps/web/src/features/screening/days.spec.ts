import { calendarDays, dayAfter, dayIn, daysEndingWith, daysFromTo, isDay } from './days';

test('the days of a zone whose clocks change are 23 and 25 hours long', () => {
  const hours = ({ from, to }: { from: string; to: string }) =>
    (Date.parse(to) - Date.parse(from)) / 3_600_000;
  expect(hours(daysEndingWith('2026-03-08', 1, 'America/Boise'))).toBe(23);
  expect(hours(daysEndingWith('2026-11-01', 1, 'America/Boise'))).toBe(25);
  expect(daysEndingWith('2026-01-15', 3, 'America/Boise').from).toBe('2026-01-13T07:00:00.000Z');
});

test('a day is that of the zone', () => {
  expect(dayIn('2026-01-15T06:00:00Z', 'America/Boise')).toBe('2026-01-14');
  expect(dayAfter('2026-02-28', 1)).toBe('2026-03-01');
  expect(daysFromTo('2026-02-28', '2026-03-02')).toBe(3);
});

test('the calendar does not move while a day in it is chosen', () => {
  const weeks = calendarDays('2026-12-01', '2026-12-01');
  expect(weeks).toEqual({ from: '2026-10-28', to: '2026-12-01' });
  expect(calendarDays('2026-10-28', '2026-12-01')).toEqual(weeks);
  expect(calendarDays('2026-10-27', '2026-12-01').to).toBe('2026-10-27');
});

test.each([
  ['2026-01-31', true],
  ['2026-1-31', false],
  ['soon', false],
])('%s is a day: %s', (text, is) => expect(isDay(text)).toBe(is));

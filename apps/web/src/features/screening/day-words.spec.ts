import { calendarSentence, dayLook, dayWords } from './day-words';
import type { DayOfSensor } from './types';

const day = (changes: Partial<DayOfSensor>): DayOfSensor => ({
  ...{ sensorId: 1, expected: 144, taken: 144, suspect: 0, failed: 0, completenessPercent: 100, ...changes },
});

it.each<[Partial<DayOfSensor>, string, string]>([
  [{}, '100 %', 'some'],
  [{ failed: 3, suspect: 1, completenessPercent: 97.9 }, '97.9 %, 3 failed, 1 suspect', 'some'],
  [{ taken: 0, completenessPercent: 0 }, 'no readings', 'silent'],
  [{ expected: 0, taken: 0, completenessPercent: null }, 'not expected', 'none'],
])('a day of %j is "%s"', (changes, words, kind) => {
  expect(dayWords(day(changes))).toBe(words);
  expect(dayLook(day(changes)).kind).toBe(kind);
});

it('marks a day as suspect from a tenth on', () => {
  expect(dayLook(day({ suspect: 14 })).suspect).toBe(false);
  expect(dayLook(day({ suspect: 15 })).suspect).toBe(true);
});

it('sums the days up', () => {
  const days = [{ sensors: [day({ failed: 14 }), day({ taken: 0 })] }];
  expect(calendarSentence(days)).toBe(
    '45.1 % of the expected readings can be used. 14 readings failed, 0 suspect. 1 day of a sensor without any reading.',
  );
  expect(calendarSentence([])).toBe('No readings were expected in this time.');
});

import { localMoment, standardMidnight } from './local-time';
import { smokeValues } from './smoke';

const HOUR_S = 3600;
const ZONE = 'America/Denver';
/** 2026-01-16 18:00 UTC, 11:00 in Denver. */
const T = Date.UTC(2026, 0, 16, 18) / 1000;

/** Hours of one value each, the newest ending at `end`. */
const hours = (count: number, valueUgM3: number | null, end = T) =>
  Array.from({ length: count }, (_, ago) => ({ tEnd: end - ago * HOUR_S, valueUgM3 }));

test('constant smoke is the same by every measure', () => {
  const values = smokeValues(hours(48, 30), T, ZONE);
  for (const name of ['pm25Hour', 'pm25NowCast', 'pm25Day', 'pm25Running24h'] as const) {
    expect(values[name]).toMatchObject({ lo: 30, hi: 30 });
  }
});

test('the newest full hour stands until the next is over', () => {
  expect(smokeValues(hours(3, 12), T + 50 * 60, ZONE).pm25Hour).toMatchObject({ lo: 12, hi: 12 });
  expect(smokeValues(hours(3, 12), T + HOUR_S, ZONE).pm25Hour?.reason).toBe('the monitor gave no full hour');
});

test('the day is the last finished one in standard time', () => {
  const midnight = standardMidnight(ZONE, T);
  expect(midnight).toBe(Date.UTC(2026, 0, 16, 7) / 1000);
  const yesterday = hours(24, 40, midnight);
  expect(smokeValues([...yesterday, ...hours(11, 5)], T, ZONE).pm25Day).toMatchObject({ lo: 40, hi: 40 });
});

test('a district without a monitor says so', () => {
  expect(smokeValues(undefined, T, ZONE).pm25NowCast?.reason).toBe('the district has no PM2.5 monitor');
});

test('standard midnight stays in standard time under daylight saving; the clock does not', () => {
  const summer = Date.UTC(2026, 6, 16, 6, 30) / 1000;
  expect(localMoment(ZONE, summer)).toEqual({ month: 7, day: 16, hour: 0 });
  expect(standardMidnight(ZONE, summer)).toBe(Date.UTC(2026, 6, 15, 7) / 1000);
});

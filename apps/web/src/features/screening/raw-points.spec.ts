import { rawPoints, reachOf } from './raw-points';
import type { RawReading, RawSeries } from './types';

const MINUTE = 60_000;
const reading = (minute: number, value: number, quality: RawReading['quality'] = 'valid'): RawReading => ({
  t: new Date(minute * MINUTE).toISOString(),
  ...{ value, quality },
});
const series = (points: RawReading[]) => [{ points } as RawSeries];

it('reaches what is used and what failed near it, not what failed far away', () => {
  const { lowest, highest } = reachOf(series([reading(10, -5), reading(20, 5), reading(30, 1e5, 'failed')]));
  expect([lowest, highest]).toEqual([-5.8, 5.8]);
  expect(reachOf(series([reading(10, -5), reading(20, 5), reading(30, 15, 'failed')])).highest).toBe(16.6);
  expect(reachOf(series([reading(10, 99, 'failed')])).highest).toBeGreaterThan(99);
  expect(reachOf([])).toEqual({ lowest: 0, highest: 1 });
});

it('puts what lies beyond at the edge and breaks the line at gaps', () => {
  const points = rawPoints(
    [reading(10, 1), reading(20, 1e5), reading(60, 2)],
    { lowest: 0, highest: 6 },
    25 * MINUTE,
  );
  expect(points.map(({ y }) => y)).toEqual([1, 6, null, 2]);
  expect(points[1]!.reading!.value).toBe(1e5);
});

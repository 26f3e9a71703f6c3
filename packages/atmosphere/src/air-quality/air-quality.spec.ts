import aqi from '../../../../fixtures/golden/aqi-2024.json';
import nowcast from '../../../../fixtures/golden/nowcast.json';
import { isNotKnown } from '../bounds';
import {
  nowCast,
  pm25Aqi,
  PM25_AQI_BANDS,
  regulatoryDayMean,
  runningDayMean,
  truncatedToTenth,
  type HourlyMean,
} from '.';

describe('AQI of PM2.5, 2024', () => {
  it.each(aqi.rows)('%f µg/m³', (concentration, truncated, index, category) => {
    expect(pm25Aqi(Number(concentration))).toMatchObject({
      truncatedUgM3: truncated,
      index,
      category,
      beyondTheIndex: false,
    });
  });
  it('says beyond the index, never caps', () => {
    expect(pm25Aqi(325.49)).toMatchObject({ index: 500, beyondTheIndex: false });
    expect(pm25Aqi(325.5)).toMatchObject({ index: null, category: 'Hazardous', beyondTheIndex: true });
  });
  it('takes negative means as 0 and has no index for NaN', () => {
    expect(pm25Aqi(-2)).toMatchObject({ index: 0, category: 'Good', truncatedUgM3: 0 });
    expect([pm25Aqi(NaN), pm25Aqi(Infinity)]).toEqual([null, null]);
  });
  it('leaves no tenth without a band', () => {
    for (let tenth = 0; tenth <= 3254; tenth += 1) {
      expect(truncatedToTenth(tenth / 10)).toBe(tenth / 10);
      expect(PM25_AQI_BANDS.filter((b) => tenth / 10 >= b.fromUgM3 && tenth / 10 <= b.toUgM3)).toHaveLength(
        1,
      );
    }
  });
});

describe('NowCast', () => {
  it.each(nowcast.cases)('$name', ({ hours_newest_first, weight, nowcast: value, truncated, aqi: index }) => {
    const found = nowCast(hours_newest_first);
    if (value === null) {
      expect([isNotKnown(found.reportedUgM3), found.weight]).toEqual([true, null]);
      return;
    }
    expect(Math.abs(found.valueUgM3.lo - value)).toBeLessThanOrEqual(nowcast.absoluteTolerance);
    expect(found.weight).toBeCloseTo(weight!, 5);
    expect(found.reportedUgM3.lo).toBe(truncated);
    expect(pm25Aqi(found.reportedUgM3.lo)!.index).toBe(index);
  });
  it('enters negatives as 0 and says so; says that every hour was 0', () => {
    expect(nowCast([-1, 10, 10])).toMatchObject({ weight: 0.5, notes: ['negative hours entered as 0'] });
    expect(nowCast([-3, -1, 0])).toMatchObject({
      reportedUgM3: { lo: 0, hi: 0 },
      notes: ['negative hours entered as 0', 'every hour was 0'],
    });
  });
  it('passes over hours after the twelfth, and takes NaN as missing', () => {
    expect(nowCast([...Array<number>(12).fill(10), 500]).reportedUgM3.lo).toBe(10);
    expect(isNotKnown(nowCast([NaN, NaN, 5, 5]).reportedUgM3)).toBe(true);
    expect(isNotKnown(nowCast([]).reportedUgM3)).toBe(true);
  });
});

describe('24-h means', () => {
  const H = 3600;
  /** Local standard time UTC−7: the day 2026-01-10 runs from 07:00Z to 07:00Z. */
  const midnight = Date.UTC(2026, 0, 11, 7) / 1000;
  const hours = (n: number, value: number): HourlyMean[] =>
    Array.from({ length: n }, (_, i) => ({ tEnd: midnight - i * H, valueUgM3: value }));
  it.each([
    [24, 20, 20, 20],
    [18, 20, 20, 20],
    [17, 20, -Infinity, Infinity],
    [17, 60, 42.5, Infinity],
  ])('of %i hours at %f µg/m³', (n, value, lo, hi) => {
    const { meanUgM3 } = regulatoryDayMean(hours(n, value), midnight - 5 * H, -7 * H);
    expect([meanUgM3.lo, meanUgM3.hi]).toEqual([lo, hi]);
  });
  it('go from midnight to midnight local standard time; the running one ends anywhere', () => {
    const both = [...hours(24, 10), ...hours(24, 30).map((h) => ({ ...h, tEnd: h.tEnd + 24 * H }))];
    expect(regulatoryDayMean(both, midnight, -7 * H)).toMatchObject({ tEnd: midnight, meanUgM3: { lo: 10 } });
    expect(regulatoryDayMean(both, midnight + 1, -7 * H)).toMatchObject({
      tEnd: midnight + 24 * H,
      meanUgM3: { lo: 30 },
    });
    expect(runningDayMean(both, midnight + 12 * H)).toMatchObject({
      tEnd: midnight + 12 * H,
      meanUgM3: { lo: 20 },
      hours: 24,
    });
  });
});

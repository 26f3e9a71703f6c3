import fc from 'fast-check';
import {
  blockEnd,
  blockMean,
  blockMeans,
  defaultBlockS,
  hourMean,
  isEnough,
  meanDirectionDeg,
  type BlockReading,
} from '.';

const reading = (tEnd: number, value: number | null, quality: BlockReading['quality'] = 'valid') => ({
  tEnd,
  value,
  quality,
});
const settings = { blockS: 900, intervalS: 300, minimumShare: 0.75 };

describe('blocks', () => {
  it.each([
    [60, 900],
    [300, 900],
    [600, 600],
    [900, 900],
    [3600, 3600],
  ])('an interval of %i s has blocks of %i s', (intervalS, expected) => {
    expect(defaultBlockS(intervalS)).toBe(expected);
    expect(() => defaultBlockS(0)).toThrow('above 0');
  });
  it('belong to (start, end]: a reading on the boundary ends its block', () => {
    expect([blockEnd(900, 900), blockEnd(901, 900), blockEnd(0, 900)]).toEqual([900, 1800, 0]);
  });
  it.each([
    [2, 3, true],
    [1, 3, false],
    [3, 4, true],
    [2, 4, false],
    [11, 15, false],
    [12, 15, true],
    [1, 1, true],
    [1, 2, false],
    [0, 1, false],
  ])('%i of %i readings are enough: %s (EPA-454/R-99-005 §5.3)', (n, expected, enough) => {
    expect(isEnough(n, expected)).toBe(enough);
  });
  it('leave out failed and missing, keep suspect and say so', () => {
    const readings = [
      reading(300, 1),
      reading(600, 3, 'suspect'),
      reading(900, 99, 'failed'),
      reading(0, 50),
    ];
    expect(blockMean(readings, 900, settings)).toEqual({
      tEnd: 900,
      mean: { lo: 2, hi: 2 },
      n: 2,
      expected: 3,
      quality: 'suspect',
    });
  });
  it('are not known with too few, with the reason', () => {
    expect(blockMean([reading(300, 1), reading(600, NaN), reading(900, null)], 900, settings)).toMatchObject({
      mean: { reason: '1 of 3 readings are usable' },
      quality: 'missing',
    });
  });
  it('do not depend on the order of arrival, nor on a reading that came twice', () => {
    const some = fc.array(fc.tuple(fc.integer({ min: 0, max: 40 }), fc.integer({ min: -20, max: 20 })), {
      maxLength: 30,
    });
    fc.assert(
      fc.property(some, (pairs) => {
        const readings = pairs.map(([slot, value]) => reading(slot * 300, value));
        const means = blockMeans(readings, settings);
        expect(blockMeans([...readings].reverse(), settings)).toEqual(means);
        expect(blockMeans([...readings, ...readings], settings)).toEqual(means);
      }),
    );
  });
});

describe('hours', () => {
  const block = (tEnd: number, value: number, quality: BlockReading['quality'] = 'valid') =>
    blockMean([reading(tEnd, value, quality)], tEnd, { blockS: 900, intervalS: 900, minimumShare: 0.75 });
  it.each([
    [4, 'valid'],
    [3, 'valid'],
    [2, 'missing'],
  ])('of %i valid blocks are %s', (n, quality) => {
    const blocks = Array.from({ length: n }, (_, i) => block(900 * (i + 1), i));
    expect(hourMean(blocks, 3600, 900).quality).toBe(quality);
  });
  it('are suspect when a block is, and take 2 of 4 when the setting is the two valid 15-min means of EPA', () => {
    expect(hourMean([block(900, 1, 'suspect'), block(1800, 2), block(2700, 3)], 3600, 900).quality).toBe(
      'suspect',
    );
    expect(hourMean([block(900, 1), block(1800, 2)], 3600, 900, 0.5).mean).toEqual({ lo: 1.5, hi: 1.5 });
  });
});

describe('mean direction', () => {
  it.each([
    [[350, 10], 0],
    [[90, 180], 135],
    [[359, 1, null], 0],
  ])('%j', (directions, expected) => {
    const mean = meanDirectionDeg(directions).lo;
    expect(Math.min(Math.abs(mean - expected), 360 - Math.abs(mean - expected))).toBeLessThan(1e-9);
  });
  it('is not known when the directions cancel, or there are none', () => {
    expect([meanDirectionDeg([0, 180]).reason, meanDirectionDeg([null]).reason]).toEqual([
      'the wind directions cancel',
      'no wind direction was given',
    ]);
  });
});

import { lidFromLevels, sharedScale } from './column-data';
import { spreadLabels } from './geometry';

const at = (...pairs: [number, number][]) =>
  pairs.map(([heightM, temperatureC]) => ({ heightM, temperatureC }));

describe('sharedScale', () => {
  it('spans all columns of the list', () => {
    const { lo, hi } = sharedScale([at([2, -9.5], [60, -4.4]), at([2, 1.2])]);
    expect(lo).toBeLessThan(-9.5);
    expect(hi).toBeGreaterThan(1.2);
  });

  it('is at least six degrees wide', () => {
    const { lo, hi } = sharedScale([at([2, -5], [60, -5.2])]);
    expect(hi - lo).toBeCloseTo(6);
  });
});

describe('lidFromLevels', () => {
  it.each([
    ['the warmest level where it is closed', 'no' as const, at([2, -4], [10, -2.6], [30, -2.9]), 10],
    ['the highest sensor where it is open', 'at the top' as const, at([2, -9], [60, -4]), 60],
  ])('is %s', (_, open, levels, topM) => expect(lidFromLevels(levels, open)).toEqual({ topM, open }));

  it('is none where nothing is known', () => {
    expect(lidFromLevels([{ heightM: 2, temperatureC: null }], 'no')).toBeNull();
  });
});

describe('spreadLabels', () => {
  it('keeps labels apart and above the ground', () => {
    const placed = spreadLabels([100, 95, 20], 14, 98);
    expect(placed).toEqual([98, 84, 20]);
  });
});

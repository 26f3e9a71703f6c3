import { normalProbabilityBelow, sigmaOfDifference, standardDeviationOf } from '.';

describe('normal distribution', () => {
  /** Abramowitz and Stegun, table 26.1, and the usual percentage points. */
  it.each([
    [0, 0.5],
    [1, 0.841344746068543],
    [1.96, 0.97500210485178],
    [-3, 0.00134989803163],
    [1.6448536269514722, 0.95],
    [5, 0.999999713348428],
    [-8, 6.22096057427e-16],
  ])('Φ(%f)', (x, expected) => {
    expect(Math.abs(normalProbabilityBelow(x) - expected)).toBeLessThanOrEqual(
      1e-12 * Math.max(expected, 1e-3),
    );
  });
  it('reaches 0 and 1, and stays NaN', () => {
    expect([normalProbabilityBelow(-Infinity), normalProbabilityBelow(40)]).toEqual([0, 1]);
    expect(normalProbabilityBelow(NaN)).toBeNaN();
  });
});

describe('data sheets', () => {
  it('takes limits of ±0.3 °C as σ 0.173 (GUM 4.3.7)', () => {
    expect(standardDeviationOf({ kind: 'limits', value: 0.3 })).toBeCloseTo(0.173, 3);
    expect(standardDeviationOf({ kind: 'k = 2', value: 0.3 })).toBe(0.15);
    expect(standardDeviationOf({ kind: 'standard deviation', value: 0.3 })).toBe(0.3);
  });
  it('refuses what is impossible', () => {
    expect(() => standardDeviationOf({ kind: 'limits', value: -1 })).toThrow('0 or more');
    expect(() => standardDeviationOf({ kind: 'k = 2', value: NaN })).toThrow(RangeError);
  });
  it('takes the root of the sum of squares (two ±0.5 °C sensors: 0.71 °C)', () => {
    expect(sigmaOfDifference(0.5, 0.5)).toBeCloseTo(0.71, 2);
    expect([sigmaOfDifference(null, 1), sigmaOfDifference(1, undefined), sigmaOfDifference(-1, 1)]).toEqual([
      null,
      null,
      null,
    ]);
  });
});

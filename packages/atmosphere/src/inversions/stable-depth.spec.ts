import { profileOf } from '../testing/profiles';
import { floorToBench, stableDepth } from '.';

describe('stable depth', () => {
  const heights = [2, 102, 202];
  it.each<[string, (number | null)[], [number, number], [number, number]]>([
    ['inversion below, dry-unstable above', [0, 2, 1], [100, 100], [100, 100]],
    ['conditional above: dry motion still stable', [10, 11, 10.2], [100, 100], [200, Infinity]],
    ['unstable from the ground', [10, 8, 9], [0, 0], [0, 0]],
    ['stable to the top', [0, 1, 2], [200, Infinity], [200, Infinity]],
    ['cut', [0, 1, null], [100, Infinity], [100, Infinity]],
    ['cut at once', [0, null, 1], [-Infinity, Infinity], [-Infinity, Infinity]],
    ['lowest missing', [null, 0, 1], [-Infinity, Infinity], [-Infinity, Infinity]],
  ])('%s', (_, temperatures, moist, dry) => {
    const { moistM, dryM } = stableDepth(profileOf(heights, temperatures, 0.1, { pressureHPa: 1000 }));
    expect([moistM.lo, moistM.hi]).toEqual(moist);
    expect([dryM.lo, dryM.hi]).toEqual(dry);
  });
});

describe('floor to bench', () => {
  const floor = { elevationM: 800, heightM: 10, temperatureC: -12, sigmaC: 0.1, pressureHPa: 920 };
  const bench = { elevationM: 1100, heightM: 10, temperatureC: -6, sigmaC: 0.1 };
  it('is per 100 m of rise, with θ 0.98 K per 100 m above it', () => {
    const found = floorToBench(floor, bench);
    expect([found.riseM, found.differenceC.lo, found.gradientCPer100M.lo]).toEqual([300, 6, 2]);
    expect(found.potentialCPer100M.lo - 2).toBeGreaterThan(0.97);
    expect(found.potentialCPer100M.lo - 2).toBeLessThan(1.1);
    expect([found.benchWarmer, found.sure]).toEqual(['true', 'true']);
  });
  it.each([
    ['floor silent', { ...floor, temperatureC: null }, bench],
    ['bench silent', floor, { ...bench, temperatureC: NaN }],
    ['bench below', bench, floor],
  ])('%s: not known, with the reason', (_, low, high) => {
    const found = floorToBench(low, high);
    expect([found.gradientCPer100M.lo, found.benchWarmer, found.sure]).toEqual([
      -Infinity,
      'not known',
      'not known',
    ]);
    expect(found.gradientCPer100M.reason).toBeTruthy();
  });
});

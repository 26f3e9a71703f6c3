import fc from 'fast-check';
import { levelsOfATower, profileOf } from '../testing/profiles';
import { makeProfile, measuredLevels } from '.';

describe('makeProfile', () => {
  it('arranges levels of any order, and keeps missing ones', () => {
    const profile = profileOf([30, 2, 10], [-5, -9, null]);
    expect(profile.levels.map((l) => [l.heightM, l.temperatureC])).toEqual([
      [2, -9],
      [10, null],
      [30, -5],
    ]);
  });

  it('does not depend on the order of its levels', () => {
    fc.assert(
      fc.property(levelsOfATower, levelsOfATower, (a, b) => {
        expect(makeProfile([...b, ...a])).toEqual(makeProfile([...a, ...b]));
      }),
    );
  });

  it('averages values at one height and passes over a missing one there', () => {
    const [both, one, none] = [
      profileOf([10, 10], [-5, -6], 0.1),
      profileOf([10, 10], [-5, null], 0.1),
      profileOf([10, 10], [null, null], 0.1),
    ].map((profile) => profile.levels);
    expect(both).toEqual([
      { heightM: 10, temperatureC: -5.5, sigmaC: expect.closeTo(0.1 / Math.SQRT2, 12), suspect: false },
    ]);
    expect(one![0]!.temperatureC).toBe(-5);
    expect(none![0]!.temperatureC).toBeNull();
  });

  it.each([NaN, null, 200, -150, Infinity])('takes %s °C as missing', (temperatureC) => {
    expect(measuredLevels(profileOf([2, 10], [temperatureC, 1])).map((l) => l.heightM)).toEqual([10]);
  });

  it('says what it set aside', () => {
    expect(profileOf([2, NaN, 10], [200, 1, 2]).notes).toEqual([
      '200 °C at 2 m is no temperature of air and was set aside',
      'a level without a height was set aside',
    ]);
  });

  it('takes failed and missing levels as missing, suspect ones as they are', () => {
    const level = (heightM: number, quality: 'valid' | 'suspect' | 'failed' | 'missing') => ({
      heightM,
      temperatureC: 1,
      quality,
    });
    const { levels } = makeProfile([
      level(1, 'valid'),
      level(2, 'suspect'),
      level(3, 'failed'),
      level(4, 'missing'),
    ]);
    expect(levels.map((l) => [l.temperatureC, l.suspect])).toEqual([
      [1, false],
      [1, true],
      [null, false],
      [null, false],
    ]);
  });

  it.each([
    [{ pressureHPa: 850 }, 850, false],
    [{ elevationM: 1000 }, 898.7, true],
    [{ pressureHPa: 5, elevationM: 1000 }, 898.7, true],
    [{}, 1013.25, true],
    [{ elevationM: NaN, pressureHPa: NaN }, 1013.25, true],
  ])('takes pressure from %j', (air, pressureHPa, assumed) => {
    const profile = profileOf([2, 10], [0, 1], undefined, air);
    expect(profile.pressureHPa).toBeCloseTo(pressureHPa, 1);
    expect(profile.pressureAssumed).toBe(assumed);
  });
});

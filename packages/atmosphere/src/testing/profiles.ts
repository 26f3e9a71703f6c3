import fc from 'fast-check';
import { makeProfile, type Level, type Profile, type ProfileAir } from '../profile';

/** A profile from heights and temperatures; null is a level that gave nothing. */
export const profileOf = (
  heightsM: readonly number[],
  temperaturesC: readonly (number | null)[],
  sigmaC?: number,
  air?: ProfileAir,
): Profile =>
  makeProfile(
    heightsM.map((heightM, i) => ({ heightM, temperatureC: temperaturesC[i]!, sigmaC })),
    air,
  );

/** Levels as a tower may give them: tenths of a degree, some missing, some suspect, in any order. */
export const levelsOfATower: fc.Arbitrary<Level[]> = fc
  .uniqueArray(fc.integer({ min: 1, max: 120 }), { minLength: 0, maxLength: 8 })
  .chain((heights) =>
    fc.tuple(
      ...heights.map((heightM) =>
        fc.record({
          heightM: fc.constant(heightM),
          temperatureC: fc.oneof(
            { weight: 6, arbitrary: fc.integer({ min: -300, max: 100 }).map((t) => t / 10) },
            { weight: 1, arbitrary: fc.constantFrom(null, NaN, 200) },
          ),
          sigmaC: fc.constantFrom(0.1, 0.3, null),
          quality: fc.constantFrom('valid' as const, 'valid' as const, 'suspect' as const, 'failed' as const),
        }),
      ),
    ),
  ) as fc.Arbitrary<Level[]>;

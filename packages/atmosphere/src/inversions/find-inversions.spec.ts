import fc from 'fast-check';
import golden from '../../../../fixtures/golden/inversion-profiles.json';
import { isKnown, isNotKnown } from '../bounds';
import { makeProfile } from '../profile';
import { levelsOfATower, profileOf } from '../testing/profiles';
import { findInversions, type InversionForm } from '.';

const plain = (heights: readonly number[], temperatures: readonly (number | null)[], sigma?: number) =>
  findInversions(profileOf(heights, temperatures, sigma), { form: 'plain' });
const aware = (heights: readonly number[], temperatures: readonly (number | null)[], sigma = 0.1) =>
  findInversions(profileOf(heights, temperatures, sigma));
const spans = (found: ReturnType<typeof findInversions>) =>
  found.inversions.map((i) => [i.kind, i.baseM, i.topM, i.open]);

describe('golden profiles (Kahl 1990, embed depth 100 m)', () => {
  it.each(golden.profiles)('$name', ({ z_m, T_C, expected }) => {
    const found = findInversions(profileOf(z_m, T_C), { form: 'plain', embedDepthM: golden.embedDepthM });
    expect(found.inversions).toHaveLength(expected.length);
    expected.forEach((e, i) => {
      const inversion = found.inversions[i]!;
      expect([inversion.baseM, inversion.topM, inversion.kind === 'surface-based']).toEqual([
        e.base_m,
        e.top_m,
        e.surface_based,
      ]);
      expect(inversion.depthWithinTowerM).toBe(e.depth_m);
      expect(Math.abs(inversion.strengthWithinTowerC - e.strength_C)).toBeLessThan(golden.absoluteTolerance);
      expect(Math.abs(inversion.gradientCPer100M - e.gradient_C_per_100m)).toBeLessThan(
        golden.absoluteTolerance,
      );
    });
  });
});

describe('plain form', () => {
  const heights = [2, 10, 30, 60];
  const cases: [string, (number | null)[], unknown[]][] = [
    ['mixed', [0, -1, -2, -3], []],
    [
      'equal temperatures end it',
      [0, 1, 1, 2],
      [
        ['surface-based', 2, 10, 'no'],
        ['elevated', 30, 60, 'at the top'],
      ],
    ],
    ['closed', [0, 1, 2, 1], [['surface-based', 2, 30, 'no']]],
    ['open at the top', [0, 1, 2, 3], [['surface-based', 2, 60, 'at the top']]],
    ['cut', [0, 1, null, 3], [['surface-based', 2, 10, 'cut by a missing level']]],
    ['above a missing level', [0, null, 1, 2], [['elevated', 30, 60, 'at the top']]],
    ['lowest missing', [null, 0, 1, 0], [['surface-based', 10, 30, 'no']]],
    [
      'two',
      [0, 1, 0, 1],
      [
        ['surface-based', 2, 10, 'no'],
        ['elevated', 30, 60, 'at the top'],
      ],
    ],
    ['top missing', [0, 1, 2, null], [['surface-based', 2, 30, 'cut by a missing level']]],
  ];
  it.each(cases)('%s', (_, temperatures, expected) => {
    expect(spans(plain(heights, temperatures))).toEqual(expected);
  });
});

describe('sensor-aware form', () => {
  it('passes over a decrease the sensors cannot tell', () => {
    expect(spans(aware([2, 10, 30, 60], [0, 1, 0.9, 2]))).toEqual([['surface-based', 2, 60, 'at the top']]);
    expect(spans(aware([2, 10, 30, 60], [0, 1, 0.7, 2]))).toEqual([
      ['surface-based', 2, 10, 'no'],
      ['elevated', 30, 60, 'at the top'],
    ]);
  });
  it('merges consecutive decreases first: two small ones make a large one', () => {
    expect(spans(aware([2, 10, 30, 60, 90], [0, 1, 0.85, 0.7, 2]))[0]).toEqual([
      'surface-based',
      2,
      10,
      'no',
    ]);
  });
  it('counts every decrease where no uncertainty is known', () => {
    const temperatures = [0, 1, 0.99, 2];
    expect(spans(findInversions(profileOf([2, 10, 30, 60], temperatures)))).toEqual(
      spans(plain([2, 10, 30, 60], temperatures)),
    );
  });
  it('is never as cold at its top as at its base', () => {
    fc.assert(
      fc.property(
        levelsOfATower,
        fc.constantFrom<InversionForm>('plain', 'sensor-aware'),
        fc.constantFrom(0, 25, 100),
        (levels, form, embedDepthM) => {
          for (const inversion of findInversions(makeProfile(levels), { form, embedDepthM }).inversions) {
            expect(inversion.strengthWithinTowerC).toBeGreaterThan(0);
            expect(inversion.topM).toBeGreaterThan(inversion.baseM);
            expect(inversion.steepest.gradientCPer100M).toBeGreaterThanOrEqual(
              inversion.gradientCPer100M - 1e-9,
            );
          }
        },
      ),
    );
  });
});

describe('surface finding', () => {
  const heights = [2, 10, 30];
  it.each<[string, (number | null)[], string]>([
    ['rises', [0, 1, 2], 'present'],
    ['falls', [1, 0, 2], 'absent'],
    ['equal', [1, 1, 2], 'absent'],
    ['lowest missing, shown from above', [null, 0, 1], 'present'],
    ['lowest missing, not shown', [null, 1, 0], 'not known'],
    ['next to the lowest missing', [0, null, 1], 'not known'],
    ['one level only', [0, null, null], 'not known'],
    ['nothing', [null, null, null], 'not known'],
  ])('%s', (_, temperatures, finding) => {
    const { surface } = plain(heights, temperatures);
    expect(surface.finding).toBe(finding);
    expect(surface.lowestLevelM).toBe(2);
    expect(isNotKnown(surface.strengthC)).toBe(finding === 'not known');
    expect(surface.reason === undefined).toBe(finding !== 'not known');
  });
  it('is not known for an empty profile and for a single level, with the reason', () => {
    expect(findInversions(makeProfile([])).surface.reason).toBe('the tower gave no temperature level');
    expect(findInversions(profileOf([2], [1])).surface.reason).toBe('a profile needs two levels or more');
  });

  it.each<[string, (number | null)[], [number, number]]>([
    ['closed', [0, 2, 1], [2, 2]],
    ['open', [0, 1, 2.5], [2.5, Infinity]],
    ['base not seen', [null, 0, 1], [1, Infinity]],
    ['absent', [2, 1, 0], [0, 0]],
    ['not known', [0, null, 1], [-Infinity, Infinity]],
  ])('strength when %s', (_, temperatures, [lo, hi]) => {
    const { strengthC } = plain(heights, temperatures).surface;
    expect([strengthC.lo, strengthC.hi]).toEqual([lo, hi]);
  });

  it('knows strength within the tower as a number when open', () => {
    expect(plain(heights, [0, 1, 2.5]).surface.strengthWithinTowerC).toEqual({ lo: 2.5, hi: 2.5 });
  });

  it('says how sure: σ from the two end sensors; a suspect level makes it not sure', () => {
    const { surface } = aware([2, 10], [0, 0.2]);
    expect(surface.inversion!.sigmaC).toBeCloseTo(0.1414, 4);
    expect(surface.probability).toBeCloseTo(0.921, 3);
    expect([surface.sure, aware([2, 10], [0, 1]).surface.sure, aware([2, 10], [1, 0]).surface.sure]).toEqual([
      'false',
      'true',
      'true',
    ]);
    const suspect = makeProfile([
      { heightM: 2, temperatureC: 0, sigmaC: 0.1, quality: 'suspect' },
      { heightM: 10, temperatureC: 5, sigmaC: 0.1 },
    ]);
    expect(findInversions(suspect).surface.sure).toBe('false');
    expect(plain([2, 10], [0, 1]).surface.sure).toBe('not known');
  });

  it('never becomes absent when a reading goes missing', () => {
    fc.assert(
      fc.property(levelsOfATower, fc.nat(7), (levels, which) => {
        fc.pre(levels.length > 0);
        const missing = levels.map((l, i) =>
          i === which % levels.length ? { ...l, temperatureC: null } : l,
        );
        const [before, after] = [
          findInversions(makeProfile(levels)).surface,
          findInversions(makeProfile(missing)).surface,
        ];
        if (before.finding !== 'absent') expect(after.finding).not.toBe('absent');
        if (after.lowestLevelMissing) expect(after.finding).not.toBe('absent');
      }),
    );
  });

  it('keeps its strength when a straight line is refined', () => {
    const slope = fc.integer({ min: -30, max: 30 });
    fc.assert(
      fc.property(slope, slope, (a, b) => {
        const [t1, t2] = [(a * 8) / 16, (a * 8 + b * 16) / 16];
        const coarse = plain([2, 10, 26], [0, t1, t2]).surface.strengthWithinTowerC;
        const fine = plain([2, 6, 10, 18, 26], [0, t1 / 2, t1, (t1 + t2) / 2, t2]).surface
          .strengthWithinTowerC;
        expect(fine).toEqual(coarse);
      }),
    );
  });
});

describe('elevated lid', () => {
  it.each<[string, (number | null)[], string]>([
    ['strong and sure', [0, -1, 1, 0], 'true'],
    ['too weak', [0, -1, -0.8, -1], 'false'],
    ['only at the ground', [0, 2, 1, 0], 'false'],
    ['a level missing', [0, -1, null, -2], 'not known'],
    ['weak but open', [0, -1, -2, -1.75], 'not known'],
  ])('%s', (_, temperatures, expected) => {
    expect(aware([2, 10, 30, 60], temperatures, 0.05).lid.present).toBe(expected);
  });
  it('gives base and strength of the lowest that counts', () => {
    const { lid } = aware([2, 10, 30, 60], [0, -1, 1, 0]);
    expect([lid.baseM, isKnown(lid.strengthC)]).toEqual([{ lo: 10, hi: 10 }, true]);
  });
});

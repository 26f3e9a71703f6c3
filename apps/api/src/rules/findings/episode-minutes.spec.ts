import { atLeast, exactly, notKnown } from '@lidwatch/atmosphere';
import { episodeMinutes, type StrengthAt } from './episode-minutes';

const BLOCK_S = 900;

/** How long it has lasted after these strengths (null: not known), newest last; before them nothing is on record. */
function lasted(strengths: readonly (number | null)[], spoke: readonly string[] = []) {
  const at = (t: number): StrengthAt => {
    const i = t / BLOCK_S - 1;
    const strength = strengths[i];
    if (typeof strength !== 'number') return { spoke: null, strengthC: notKnown('silent') };
    return { spoke: spoke[i] ?? 'mill', strengthC: exactly(strength) };
  };
  const t = strengths.length * BLOCK_S;
  const { lo, hi } = episodeMinutes(at(t), at, t, BLOCK_S);
  return hi === lo ? lo : [lo, hi];
}

const CASES: readonly [string, (number | null)[], number | number[], string[]?][] = [
  ['no inversion has lasted no time', [3, 0], 0],
  ['not known now is not known', [3, null], [-Infinity, Infinity]],
  ['back to when it was last absent', [0, 1, 2, 3], 45],
  ['over a silence of up to an hour', [0, 1, null, null, null, null, 3], 90],
  [
    'a longer silence leaves at least what came after',
    [0, 1, null, null, null, null, null, 3],
    [15, Infinity],
  ],
  ['from the start of the record at least', [1, 2], [30, Infinity]],
  ['another tower starts anew', [0, 2, 2, 2], 30, ['mill', 'mill', 'bench', 'bench']],
];

for (const [name, strengths, expected, spoke] of CASES) {
  test(name, () => expect(lasted(strengths, spoke)).toEqual(expected));
}

test('is followed for two days at most', () => {
  const strong: StrengthAt = { spoke: 'mill', strengthC: atLeast(3) };
  expect(episodeMinutes(strong, () => strong, 900_000, BLOCK_S)).toMatchObject({ lo: 48 * 60, hi: Infinity });
});

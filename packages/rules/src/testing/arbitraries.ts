import { between, exactly, notKnown, type Quantity } from '@lidwatch/atmosphere';
import fc from 'fast-check';
import type { Clause, Condition, Held } from '../definition/rule-definition';
import type { MeasuredBlock, MeasuredValues } from '../evaluation/measured-block';
import type { MeasureName } from '../measures/catalogue';

/** The measures that random trees and blocks are about: few, so that clauses meet. */
export const TRIED_MEASURES: readonly MeasureName[] = ['inversionStrengthC', 'pm25NowCast', 'inversionSure'];

const BLOCK_SECONDS = 900;

const anyHeld = (tolerances: readonly number[]): fc.Arbitrary<Held> =>
  fc.oneof(
    { weight: 2, arbitrary: fc.constant({}) },
    {
      weight: 1,
      arbitrary: fc.record({
        heldMinutes: fc.constantFrom(15, 20, 30, 45, 60, 120),
        toleranceMinutes: fc.constantFrom(...tolerances),
      }),
    },
  );

const anyClause: fc.Arbitrary<Clause> = fc.oneof(
  fc.record({
    measure: fc.constantFrom<MeasureName>('inversionStrengthC', 'pm25NowCast'),
    op: fc.constantFrom('>=' as const, '>' as const, '<=' as const, '<' as const),
    value: fc.integer({ min: 0, max: 4 }),
  }),
  fc.record({
    measure: fc.constant<MeasureName>('inversionSure'),
    op: fc.constant('=' as const),
    value: fc.boolean(),
  }),
);

/** Random condition trees up to three groups deep, whose held-for tolerates one of the minutes given. */
export function anyCondition(tolerances: readonly number[]): fc.Arbitrary<Condition> {
  const withHeld = <T extends object>(bare: fc.Arbitrary<T>): fc.Arbitrary<T & Held> =>
    fc.tuple(bare, anyHeld(tolerances)).map(([condition, held]) => ({ ...condition, ...held }));
  return fc.letrec<{ tree: Condition }>((tie) => {
    const parts = fc.array(tie('tree'), { minLength: 1, maxLength: 3 });
    return {
      tree: fc.oneof(
        { maxDepth: 3, withCrossShrink: true },
        withHeld(anyClause),
        withHeld(fc.record({ all: parts })),
        withHeld(fc.record({ any: parts })),
        withHeld(fc.record({ not: tie('tree') })),
      ),
    };
  }).tree;
}

/** A number, a range, an open range or not known, around the limits of the random clauses. */
export const anyQuantity: fc.Arbitrary<Quantity> = fc.oneof(
  { weight: 6, arbitrary: fc.integer({ min: -1, max: 5 }).map(exactly) },
  { weight: 1, arbitrary: fc.constant(notKnown('the sensor was silent')) },
  { weight: 1, arbitrary: fc.integer({ min: -1, max: 5 }).map((lo) => between(lo, Infinity)) },
  {
    weight: 1,
    arbitrary: fc
      .tuple(fc.integer({ min: -1, max: 5 }), fc.nat(3))
      .map(([lo, width]) => between(lo, lo + width)),
  },
);

const anyValues: fc.Arbitrary<MeasuredValues> = fc.record(
  {
    inversionStrengthC: anyQuantity,
    pm25NowCast: anyQuantity,
    inversionSure: fc.oneof(fc.constantFrom(0, 1).map(exactly), fc.constant(notKnown('not sure'))),
  },
  { requiredKeys: [] },
);

/** Random series of 15-min blocks with gaps, silence and changes of the answering tower. */
export const anyBlocks: fc.Arbitrary<MeasuredBlock[]> = fc
  .array(
    fc.record({
      values: anyValues,
      speaker: fc.constantFrom('mill', 'mill', 'mill', 'mill', 'bench', null),
      skipped: fc.constantFrom(0, 0, 0, 0, 0, 1, 2),
    }),
    { minLength: 1, maxLength: 14 },
  )
  .map((drafts) => {
    let tEnd = 0;
    return drafts.map(({ values, speaker, skipped }) => {
      tEnd += BLOCK_SECONDS * (1 + skipped);
      return { tEnd, blockSeconds: BLOCK_SECONDS, speaker, values };
    });
  });

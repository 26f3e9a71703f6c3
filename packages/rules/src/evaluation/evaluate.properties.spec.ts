import { between, notKnown, type Quantity } from '@lidwatch/atmosphere';
import fc from 'fast-check';
import { partsOf, type Condition } from '../definition/rule-definition';
import { anyBlocks, anyCondition, TRIED_MEASURES } from '../testing/arbitraries';
import { blockSeries } from './block-series';
import { evaluate } from './evaluate';
import { fromEvidence, toEvidence, type Evidence } from './evidence';
import { measuredIn, type MeasuredBlock } from './measured-block';

const RUNS = { numRuns: 2000 };
const TEND_PURPOSE = fc.constantFrom('begin' as const, 'end' as const);

/** The blocks with one value put in the place of another. */
function replaced(
  blocks: readonly MeasuredBlock[],
  at: number,
  which: number,
  by: (before: Quantity) => Quantity,
): MeasuredBlock[] {
  const measure = TRIED_MEASURES[which % TRIED_MEASURES.length]!;
  return blocks.map((block, i) =>
    i === at % blocks.length
      ? { ...block, values: { ...block.values, [measure]: by(measuredIn(block, measure)) } }
      : block,
  );
}

const truthOver = (condition: Condition, blocks: readonly MeasuredBlock[], purpose: 'begin' | 'end') =>
  evaluate(condition, blockSeries(blocks), blocks.at(-1)!.tEnd, purpose).truth;

const silence = () => notKnown('replaced');
const wider = (margin: number) => (before: Quantity) => between(before.lo - margin, before.hi + margin);
const hasNot = (condition: Condition): boolean => 'not' in condition || partsOf(condition).some(hasNot);

describe('knowing less', () => {
  test('turns no tree from false to true or from true to false', () => {
    fc.assert(
      fc.property(
        anyCondition([0]),
        anyBlocks,
        fc.nat(),
        fc.nat(),
        TEND_PURPOSE,
        (condition, blocks, i, m, purpose) => {
          const before = truthOver(condition, blocks, purpose);
          const after = truthOver(condition, replaced(blocks, i, m, silence), purpose);
          expect(after === before || after === 'not known').toBe(true);
        },
      ),
      RUNS,
    );
  });

  test('by a wider range turns none either', () => {
    fc.assert(
      fc.property(
        anyCondition([0]),
        anyBlocks,
        fc.nat(),
        fc.nat(),
        fc.nat(4),
        (condition, blocks, i, m, margin) => {
          const before = truthOver(condition, blocks, 'begin');
          const after = truthOver(condition, replaced(blocks, i, m, wider(margin)), 'begin');
          expect(after === before || after === 'not known').toBe(true);
        },
      ),
      RUNS,
    );
  });

  test('of everything leaves nothing but not known', () => {
    fc.assert(
      fc.property(anyCondition([0, 15, 30]), anyBlocks, TEND_PURPOSE, (condition, blocks, purpose) => {
        const silent = blocks.map((block) => ({ ...block, values: {} }));
        expect(truthOver(condition, silent, purpose)).toBe('not known');
      }),
      RUNS,
    );
  });

  test('under a tolerance never turns true to false where no "not" stands', () => {
    fc.assert(
      fc.property(anyCondition([0, 15, 30]), anyBlocks, fc.nat(), fc.nat(), (condition, blocks, i, m) => {
        fc.pre(!hasNot(condition));
        const before = truthOver(condition, blocks, 'begin');
        const after = truthOver(condition, replaced(blocks, i, m, silence), 'begin');
        expect([before, after]).not.toEqual(['true', 'false']);
      }),
      RUNS,
    );
  });
});

test('the order in which blocks are given changes nothing', () => {
  fc.assert(
    fc.property(anyCondition([0, 30]), anyBlocks, (condition, blocks) => {
      const t = blocks.at(-1)!.tEnd;
      const backwards = blockSeries([...blocks].reverse());
      expect(evaluate(condition, backwards, t, 'begin')).toEqual(
        evaluate(condition, blockSeries(blocks), t, 'begin'),
      );
    }),
  );
});

test('evidence survives JSON', () => {
  fc.assert(
    fc.property(anyCondition([0, 30]), anyBlocks, (condition, blocks) => {
      const node = evaluate(condition, blockSeries(blocks), blocks.at(-1)!.tEnd, 'begin');
      const read = JSON.parse(JSON.stringify(toEvidence(node))) as Evidence;
      expect(fromEvidence(read)).toEqual(node);
    }),
  );
});

import fc from 'fast-check';
import { blockSeries } from '../evaluation/block-series';
import { evaluate } from '../evaluation/evaluate';
import { anyBlocks, anyCondition, TRIED_MEASURES } from '../testing/arbitraries';
import { blockColumns } from './columns';
import { FALSE, NOT_KNOWN, TRUE, truthColumn } from './truth-column';

const CODES = { false: FALSE, 'not known': NOT_KNOWN, true: TRUE };

test('a column says of every block what an evaluation of that block says', () => {
  fc.assert(
    fc.property(
      anyCondition([0, 15, 30]),
      anyBlocks,
      fc.constantFrom('begin' as const, 'end' as const),
      (condition, blocks, purpose) => {
        const series = blockSeries(blocks);
        const one = blocks.map(({ tEnd }) => CODES[evaluate(condition, series, tEnd, purpose).truth]);
        expect([...truthColumn(condition, blockColumns(blocks, TRIED_MEASURES), purpose)]).toEqual(one);
      },
    ),
    { numRuns: 3000 },
  );
});

test('blocks of unlike lengths that overlap are counted once', () => {
  const blocks = [900, 1500, 1800, 3600, 5400].map((tEnd, i) => ({
    ...{ tEnd, blockSeconds: [900, 900, 600, 1800, 2400][i]!, speaker: 'mill' },
    values: { inversionStrengthC: { lo: i === 1 ? 1 : 3, hi: i === 1 ? 1 : 3 } },
  }));
  const condition = { measure: 'inversionStrengthC', op: '>=', value: 2, heldMinutes: 40 } as const;
  const series = blockSeries(blocks);
  const one = blocks.map(({ tEnd }) => CODES[evaluate(condition, series, tEnd, 'begin').truth]);
  expect([...truthColumn(condition, blockColumns(blocks, ['inversionStrengthC']), 'begin')]).toEqual(one);
});

test('a measure the columns lack is named', () => {
  const columns = blockColumns([], []);
  expect(() => truthColumn({ measure: 'pm25Hour', op: '>', value: 1 }, columns, 'begin')).toThrow(
    'lack pm25Hour',
  );
});

test('blocks out of order are refused', () => {
  const block = (tEnd: number) => ({ tEnd, blockSeconds: 900, speaker: null, values: {} });
  expect(() => blockColumns([block(1800), block(900)], [])).toThrow('900 is out of it');
});

import { blockSeries, evaluate, MEASURE_NAMES, type MeasuredBlock } from '@lidwatch/rules';
import { notKnown } from '@lidwatch/atmosphere';
import fc from 'fast-check';
import { createTestApp, type TestApp } from '../../testing/test-app';
import { DistrictRows } from '../findings/district-rows';
import { eveningRule, goBy, putRuleInForce } from '../../testing/evening';
import { makeValley, type Valley } from '../../testing/valley';

/** An evening that begins to hold, falters, is silent for a while and ends. */
const NIGHT = [1, 2, 2, 3, 3, 4, 4, 5, 6, 6, 6, 6, 6, 6, null, 6, 4, 1.9, 3, 3, 1, 0.5, 0, 0, 0, 0, 0, 0, 0];

describe('the evaluation of a night', () => {
  let test: TestApp;
  let valley: Valley;
  beforeAll(async () => {
    test = await createTestApp();
    valley = await makeValley(test);
    await putRuleInForce(test, valley.districtId);
    await goBy(test, valley, NIGHT);
  });
  afterAll(() => test.close());

  const inputs = async () =>
    (await test.app.get(DistrictRows, { strict: false }).series([valley.districtId], 0, 2e9)).get(
      valley.districtId,
    )!;

  it('is kept block by block with the truth of each condition', async () => {
    const rows = await test.sql.all<{ truths: string }>(
      'SELECT truths FROM evaluation WHERE district_id = $1 ORDER BY t_end',
      [valley.districtId],
    );
    const begins = rows.map(({ truths }) => JSON.parse(truths).advisory.begin);
    expect(begins).toHaveLength(NIGHT.length);
    expect(begins.slice(0, 8)).toEqual([...Array(6).fill('false'), 'true', 'true']);
    expect(JSON.parse(rows.at(-1)!.truths)).toEqual({
      advisory: { begin: 'false', end: 'true' },
      burnBan: { begin: 'false', end: 'true' },
    });
  });

  it('with any measured value not known turns no condition from false to true or from true to false', async () => {
    const blocks = await inputs();
    const purposes = (['advisory', 'burnBan'] as const).flatMap((kind) =>
      (['begin', 'end'] as const).map((act) => ({ condition: eveningRule[kind]![act], act })),
    );
    const truth = (series: MeasuredBlock[], t: number, which: number) => {
      const { condition, act } = purposes[which]!;
      return evaluate(condition, blockSeries(series), t, act).truth;
    };
    const anyBlock = fc.nat(blocks.length - 1);
    const anyMeasure = fc.constantFrom(...MEASURE_NAMES);
    fc.assert(
      fc.property(
        anyBlock,
        anyBlock,
        anyMeasure,
        fc.nat(purposes.length - 1),
        (at, which, measure, purpose) => {
          const series = blocks.map((block) => block[purposes[purpose]!.act]);
          const replaced = series.map((block, i) =>
            i === which ? { ...block, values: { ...block.values, [measure]: notKnown('replaced') } } : block,
          );
          const t = blocks[at]!.tEnd;
          const [before, after] = [truth(series, t, purpose), truth(replaced, t, purpose)];
          expect(after === before || after === 'not known').toBe(true);
        },
      ),
      { numRuns: 1500 },
    );
  });
});

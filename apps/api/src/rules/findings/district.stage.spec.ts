import { createTestApp, testNow, type TestApp } from '../../testing/test-app';
import { BLOCK_S, inversion, makeValley, type Valley } from '../../testing/valley';
import { DistrictFindingsService } from './district-findings.service';

describe('district findings', () => {
  let test: TestApp;
  beforeEach(async () => (test = await createTestApp()));
  afterEach(() => test.close());

  const latest = async (valley: Valley) =>
    (await test.app.get(DistrictFindingsService).latest(valley.districtId))!;

  async function night(valley: Valley, tower: number, strengths: readonly (number | null)[]): Promise<void> {
    for (const [i, strength] of strengths.entries()) {
      const t = testNow - (strengths.length - 1 - i) * BLOCK_S;
      if (strength !== null) await valley.give(tower, t, inversion(strength, t));
    }
    await valley.settle();
  }

  it('say what the first tower says, at least where the inversion reaches its top', async () => {
    const valley = await makeValley(test);
    await night(valley, 0, [1, 2, 3]);
    const finding = await latest(valley);
    expect(finding).toMatchObject({ tEnd: testNow, fresh: true, silent: [] });
    expect(finding.values.inversionStrengthC).toMatchObject({ lo: expect.closeTo(3, 6), hi: Infinity });
    expect(finding.values.inversionSure).toEqual({ lo: 1, hi: 1 });
    expect(finding.values.episodeMinutes).toMatchObject({ lo: 30, hi: Infinity });
    expect(finding.values.hourOfDay).toEqual({ lo: 18, hi: 18 });
    expect(finding.values.pm25NowCast?.reason).toBe('the district has no PM2.5 monitor');
  });

  it('are not known, and say so, when the newest block is old', async () => {
    const valley = await makeValley(test);
    await night(valley, 0, [3, 3]);
    test.clock.advance(46 * 60);
    const finding = await latest(valley);
    expect(finding.fresh).toBe(false);
    expect(finding.reason).toBe('no tower has answered for 46 minutes');
  });

  it('keep asking the first tower over a missed block, and the next one when it has long been silent', async () => {
    const valley = await makeValley(test, [{}, { elevationM: 1290 }]);
    await night(valley, 0, [3, 3, 3, null, null, null, null, null]);
    await night(valley, 1, [1, 1, 1, 1, 1, 1, 1, 1]);
    const rows = await test.sql.all<{ spoke: string; lo: number | null }>(
      'SELECT spoke, strength_lo lo FROM district_block WHERE district_id = $1 ORDER BY t_end',
      [valley.districtId],
    );
    const [first, second] = valley.towerIds.map(String);
    expect(rows.map(({ spoke }) => spoke)).toEqual([...Array(7).fill(first), second]);
    expect(rows.map(({ lo }) => lo && Math.round(lo))).toEqual([3, 3, 3, null, null, null, null, 1]);
  });

  it('keep a tower that may not end out of the series for ending', async () => {
    const valley = await makeValley(test, [{ mayEnd: 0 }, { mayBegin: 0, elevationM: 1290 }]);
    await night(valley, 0, [4]);
    await night(valley, 1, [1]);
    const row = await test.sql.get<{ measures: string; ending: string }>(
      'SELECT measures, end_measures ending FROM district_block WHERE district_id = $1',
      [valley.districtId],
    );
    const strength = (text: string) =>
      Math.round((JSON.parse(text) as Record<string, number[]>)['inversionStrengthC']![0]!);
    expect([strength(row!.measures), strength(row!.ending)]).toEqual([4, 1]);
  });

  it('of several towers together widen by each that is silent', async () => {
    const valley = await makeValley(test, [{}, { elevationM: 1290 }], { combine: 'all' });
    await night(valley, 0, [4]);
    expect((await latest(valley)).values.inversionStrengthC).toMatchObject({ lo: -Infinity });
    await night(valley, 1, [1]);
    expect((await latest(valley)).values.inversionStrengthC).toMatchObject({ lo: expect.closeTo(1, 6) });
  });

  it('are the same whatever the order in which readings came', async () => {
    const strengths = [0, 1, 2, 3, 0, 2, 2, null, 3];
    const straight = await makeValley(test);
    await night(straight, 0, strengths);
    const shuffled = await makeValley(test);
    for (const i of [8, 2, 5, 0, 3, 6, 1, 4]) {
      const strength = strengths[i];
      if (typeof strength !== 'number') continue;
      const t = testNow - (strengths.length - 1 - i) * BLOCK_S;
      await shuffled.give(0, t, inversion(strength, t));
      await shuffled.settle();
    }
    const rows = (id: number) =>
      test.sql.all(
        `SELECT t_end, block_s, silent <> '[]' silent, measures, strength_lo, strength_hi, sure, reason
         FROM district_block WHERE district_id = $1 ORDER BY t_end`,
        [id],
      );
    expect(await rows(shuffled.districtId)).toEqual(await rows(straight.districtId));
  });
});

import { goBy, putRuleInForce } from '../testing/evening';
import { makeValley, type Valley } from '../testing/valley';
import { signInAs } from '../testing/people';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';

const iso = (t: number): string => new Date(t * 1000).toISOString();

describe('the desk', () => {
  let test: TestApp;
  let valley: Valley;
  beforeEach(async () => {
    test = await createTestApp();
    valley = await makeValley(test);
    await putRuleInForce(test, valley.districtId);
  });
  afterEach(() => test.close());

  it('says nothing is known before the first block', async () => {
    const { http } = await signInAs(test, 'analyst');
    const { body } = await http.get('/api/desk').expect(200);
    expect(body.districts).toMatchObject([
      {
        ...{ tEnd: null, fresh: false, reason: 'no tower has given a block yet', speaker: null },
        finding: { surface: 'not known', strengthC: { notKnown: expect.any(String) }, sure: 'not known' },
      },
    ]);
    expect(body.towers).toMatchObject([{ newest: null, late: true }]);
  });

  it('shows the air, at least, and the proposals that wait', async () => {
    await goBy(test, valley, [3, 3, 3, 3, 3, 3]);
    const { http } = await signInAs(test, 'analyst');
    const { body } = await http.get('/api/desk').expect(200);
    expect(body.districts[0]).toMatchObject({
      ...{ fresh: true, name: 'Mill Flats', silent: [], inForce: [] },
      finding: {
        surface: 'present',
        strengthC: { atLeast: expect.closeTo(3, 6) },
        sure: 'true',
        open: 'at the top',
        topM: 60,
      },
      pm25NowCast: { notKnown: 'the district has no PM2.5 monitor' },
    });
    expect(body.districts[0].levels).toHaveLength(4);
    expect(body.proposals).toMatchObject([{ kind: 'advisory', state: 'open' }]);
    expect(body.towers).toMatchObject([{ late: false }]);
  });

  it('takes nothing of an old block for now', async () => {
    await goBy(test, valley, [3]);
    test.clock.advance(3600);
    const { http } = await signInAs(test, 'analyst');
    const { body } = await http.get('/api/desk').expect(200);
    expect(body.districts[0]).toMatchObject({
      ...{ fresh: false, reason: 'no tower has answered for 60 minutes' },
      finding: { surface: 'not known', sure: 'not known' },
      surfaceTemperatureC: { notKnown: expect.any(String) },
    });
  });

  it('shows an officer their own districts only', async () => {
    const { http } = await signInAs(test, 'officer', { districts: [] });
    expect((await http.get('/api/desk').expect(200)).body.districts).toEqual([]);
  });

  it('tells the history with the limits that decide, gaps as not known', async () => {
    await goBy(test, valley, [1, 2, null, 3]);
    const { http } = await signInAs(test, 'analyst');
    const query = `from=${iso(testNow - 3600)}&to=${iso(test.clock.now())}`;
    const { body } = await http.get(`/api/districts/${valley.districtId}/history?${query}`).expect(200);
    expect(body.stepMinutes).toBe(10);
    expect(body.points.map(({ strength }: { strength: object }) => Object.keys(strength)[0])).toEqual([
      'exactly',
      'atLeast',
      'notKnown',
      'atLeast',
    ]);
    expect(body.limits).toContainEqual({
      ...{
        kind: 'advisory',
        act: 'begin',
        measure: 'inversionStrengthC',
        op: '>=',
        value: 2,
        heldMinutes: 60,
      },
    });
    expect(body.nights).toHaveLength(1);
  });

  it('gives no more than 2,000 points, and says the step', async () => {
    const { http } = await signInAs(test, 'analyst');
    const query = `from=${iso(testNow - 300 * 86_400)}&to=${iso(testNow)}`;
    const { body } = await http.get(`/api/districts/${valley.districtId}/history?${query}`).expect(200);
    expect(body.stepMinutes).toBeGreaterThanOrEqual(216);
  });

  it('loses no peak of a long history, and tells the lowest of each step', async () => {
    await goBy(test, valley, [0.5, 5, 1]);
    const { http } = await signInAs(test, 'analyst');
    const query = `from=${iso(testNow - 300 * 86_400)}&to=${iso(testNow + 86_400)}`;
    const { body } = await http.get(`/api/districts/${valley.districtId}/history?${query}`).expect(200);
    expect(body.stepMinutes).toBe(240);
    expect(body.points).toMatchObject([
      {
        within: expect.closeTo(5, 6),
        lowest: expect.closeTo(0.5, 6),
        strength: { atLeast: expect.closeTo(5, 6) },
      },
    ]);
    expect(Date.parse(body.points[0].t) % (240 * 60_000)).toBe(0);
    expect(Date.parse(body.points[0].strongestAt)).toBeLessThan(Date.parse(body.points[0].t));
  });

  it.each([
    ['to before from', `from=${iso(testNow)}&to=${iso(testNow - 1)}`],
    ['no instants', 'from=yesterday&to=today'],
    ['a span of years', `from=${iso(0)}&to=${iso(testNow)}`],
  ])('refuses %s', async (_, query) => {
    const { http } = await signInAs(test, 'analyst');
    const { body } = await http.get(`/api/districts/${valley.districtId}/history?${query}`).expect(422);
    expect(body.errors[0].field).toMatch(/^(from|to)$/);
  });
});

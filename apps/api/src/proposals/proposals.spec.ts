import { goBy, putRuleInForce } from '../testing/evening';
import { makeValley, type Valley } from '../testing/valley';
import { signInAs, testPassword, type SignedInAgent } from '../testing/people';
import { createTestApp, type TestApp } from '../testing/test-app';

const HOUR = [3, 3, 3, 3, 3, 3];

describe('a proposal', () => {
  let test: TestApp;
  let valley: Valley;
  let analyst: SignedInAgent;
  let officer: SignedInAgent;

  beforeEach(async () => {
    test = await createTestApp();
    valley = await makeValley(test);
    await putRuleInForce(test, valley.districtId);
    analyst = await signInAs(test, 'analyst');
    officer = await signInAs(test, 'officer', { districts: [valley.districtId] });
  });
  afterEach(() => test.close());

  /** Lets blocks go by; afterwards people sign in again, for a session does not last the evening. */
  async function evening(strengths: readonly (number | null)[]): Promise<void> {
    await goBy(test, valley, strengths);
    for (const { http, email } of [analyst, officer]) {
      await http.post('/api/auth/sign-in').send({ email, password: testPassword }).expect(200);
    }
  }

  const waiting = async (
    who = analyst,
  ): Promise<{ id: number; kind: string; act: string; version: number }[]> =>
    (await who.http.get('/api/proposals?state=waiting').expect(200)).body.items;
  const states = () =>
    test.sql.all<{ kind: string; act: string; state: string; reason: string | null }>(
      'SELECT kind, act, state, reason FROM proposal ORDER BY id',
    );

  async function confirmed(): Promise<number> {
    const [open] = await waiting();
    await analyst.http
      .post(`/api/proposals/${open!.id}/confirm`)
      .send({ note: 'Calm and clear until morning.', version: open!.version })
      .expect(200);
    return open!.id;
  }

  async function issue(id: number, password?: string) {
    const preview = await officer.http.post(`/api/proposals/${id}/preview`).send({}).expect(200);
    const { body } = await officer.http.get(`/api/proposals/${id}`).expect(200);
    const wanted = {
      previewHash: preview.body.hash,
      version: body.version,
      requestKey: `key-of-proposal-${id}`,
    };
    return officer.http.post(`/api/proposals/${id}/issue`).send(password ? { ...wanted, password } : wanted);
  }

  it('opens once the condition has held, with its evidence', async () => {
    await evening(HOUR.slice(1));
    expect(await waiting()).toEqual([]);
    await evening([3, 3]);
    const [open] = await waiting();
    expect(open).toMatchObject({ kind: 'advisory', act: 'begin', state: 'open', districtName: 'Mill Flats' });
    const { body } = await analyst.http.get(`/api/proposals/${open!.id}`).expect(200);
    expect(body.evidence.sentences.en).toEqual([
      'All of these: met.',
      '  Inversion at least 2 °C for 1 h: met, at least 3 °C.',
      '  Inversion sure: yes: met, yes.',
    ]);
    expect(body.evidence.tree.parts[0]).toMatchObject({
      measure: 'inversionStrengthC',
      measured: { atLeast: expect.closeTo(3, 6) },
      held: { neededMinutes: 60, trueMinutes: 60, notKnownMinutes: 0 },
    });
    expect(body.evidence.sha256).toMatch(/^[0-9a-f]{64}$/);
    expect(body.profile.levels).toHaveLength(4);
    expect(body.history).toMatchObject([{ by: 'service', act: 'opened a proposal' }]);
  });

  it('lapses when the condition turns false, never because nothing is known', async () => {
    await evening(HOUR);
    await evening([null, null]);
    expect(await states()).toMatchObject([{ state: 'open' }]);
    await evening([0]);
    expect(await states()).toMatchObject([{ state: 'lapsed', reason: 'The condition no longer holds.' }]);
  });

  it('is not made again before the earliest time the rule allows', async () => {
    await evening([...HOUR, 0, ...HOUR, 3, 3]);
    expect(await states()).toHaveLength(1);
    await evening([3, 3, 3, 3]);
    expect(await states()).toMatchObject([{ state: 'lapsed' }, { state: 'open' }]);
  });

  it('is not made from an old block', async () => {
    await evening(HOUR.slice(1));
    const tEnd = test.clock.now() + 600;
    test.clock.set(tEnd + 3600);
    await valley.give(0, tEnd, [-8, -7, -6, -5]);
    await valley.settle();
    expect(await states()).toEqual([]);
  });

  it('goes to the officer once an analyst has confirmed it, and is confirmed once', async () => {
    await evening(HOUR);
    const [open] = await waiting();
    expect(await waiting(officer)).toEqual([]);
    await officer.http.get(`/api/proposals/${open!.id}`).expect(403);
    const id = await confirmed();
    expect(await waiting(officer)).toMatchObject([
      { id, state: 'confirmed', note: 'Calm and clear until morning.' },
    ]);
    const second = await signInAs(test, 'analyst');
    const late = await second.http
      .post(`/api/proposals/${id}/confirm`)
      .send({ version: open!.version })
      .expect(409);
    expect(late.body).toMatchObject({ code: 'already-done', by: analyst.name });
    expect(late.body.detail).toMatch(`Already confirmed by ${analyst.name} at 2026-`);
  });

  it('is nothing to an officer of another district', async () => {
    await evening(HOUR);
    const id = await confirmed();
    const other = await signInAs(test, 'officer', { districts: [] });
    expect(await waiting(other)).toEqual([]);
    for (const path of ['preview', 'return']) {
      const body = path === 'return' ? { reason: 'not mine', version: 2 } : {};
      const answer = await other.http.post(`/api/proposals/${id}/${path}`).send(body).expect(403);
      expect(answer.body.code).toBe('not-your-district');
    }
  });

  it('is declined or sent back only with a reason', async () => {
    await evening(HOUR);
    const id = await confirmed();
    await officer.http.post(`/api/proposals/${id}/return`).send({ reason: '', version: 2 }).expect(422);
    await officer.http
      .post(`/api/proposals/${id}/return`)
      .send({ reason: 'Wind is picking up', version: 2 })
      .expect(200);
    const declined = await analyst.http
      .post(`/api/proposals/${id}/decline`)
      .send({ reason: 'The officer is right', version: 3 })
      .expect(200);
    expect(declined.body).toMatchObject({ state: 'declined', closedBy: analyst.name });
    expect(declined.body.history.map(({ act }: { act: string }) => act)).toEqual([
      'opened a proposal',
      'confirmed a proposal',
      'sent a proposal back',
      'declined a proposal',
    ]);
  });

  it('becomes a notice once, however often it is sent', async () => {
    await evening(HOUR);
    const id = await confirmed();
    const first = await issue(id);
    expect(first.status).toBe(200);
    expect(first.body).toMatchObject({
      kind: 'advisory',
      state: 'in force',
      reason: 'Calm and clear until morning.',
    });
    expect(first.body.evidence.sentences.en[0]).toBe('All of these: met.');
    const again = await officer.http
      .post(`/api/proposals/${id}/issue`)
      .send({ previewHash: 'x'.repeat(20), version: 2, requestKey: `key-of-proposal-${id}` });
    expect(again.body.id).toBe(first.body.id);
    const other = await officer.http
      .post(`/api/proposals/${id}/issue`)
      .send({ previewHash: 'x'.repeat(20), version: 2, requestKey: 'another-key' })
      .expect(409);
    expect(other.body.code).toBe('already-done');
    expect(await test.sql.all('SELECT id FROM notice')).toHaveLength(1);
  });

  it('stays as it was when the words changed since they were read', async () => {
    await evening(HOUR);
    const id = await confirmed();
    const answer = await officer.http
      .post(`/api/proposals/${id}/issue`)
      .send({ previewHash: 'not what was seen', version: 2, requestKey: 'key-one-two' })
      .expect(409);
    expect(answer.body.code).toBe('preview-out-of-date');
    expect(await states()).toMatchObject([{ state: 'confirmed' }]);
    expect(await test.sql.all('SELECT id FROM notice')).toEqual([]);
  });

  it('of a burn ban asks for the password again', async () => {
    await evening([6, 6, 6, 6, 6, 6]);
    const kinds = (await waiting()).map(({ kind }) => kind);
    expect(kinds.sort()).toEqual(['advisory', 'burnBan']);
    const ban = (await waiting()).find(({ kind }) => kind === 'burnBan')!;
    await analyst.http.post(`/api/proposals/${ban.id}/confirm`).send({ version: 1 }).expect(200);
    expect((await issue(ban.id)).body.code).toBe('password-needed');
    expect((await issue(ban.id, 'a guess')).body.code).toBe('password-wrong');
    expect(await test.sql.all('SELECT id FROM notice')).toEqual([]);
    expect((await issue(ban.id, testPassword)).body).toMatchObject({ kind: 'burnBan', state: 'in force' });
    await evening([6]);
    expect(await states()).toContainEqual(
      expect.objectContaining({
        kind: 'advisory',
        state: 'lapsed',
        reason: 'A burn ban is in force already.',
      }),
    );
  });

  it('to end follows when the end condition has held, and ends the notice', async () => {
    await evening(HOUR);
    await issue(await confirmed());
    await evening([0, 0, null, 0, 0, 0, 0]);
    expect(await waiting()).toEqual([]);
    await evening([0, 0]);
    expect(await waiting()).toMatchObject([{ kind: 'advisory', act: 'end' }]);
    const answer = await issue(await confirmed());
    expect(answer.body).toMatchObject({ state: 'ended', endedBy: officer.name });
  });

  const UNCERTAIN: readonly [string, number, string[]][] = [
    ['is made where the sensors are as sure as their data sheets say', 1, ['open']],
    ['is not made by sensors ten times as uncertain, for nothing is sure then', 10, []],
  ];
  it.each(UNCERTAIN)('%s', async (_, times, expected) => {
    await test.sql.run('UPDATE sensor_version SET sigma = $1 * sigma', [times]);
    await evening([2.2, 2.2, 2.2, 2.2, 2.2, 2.2]);
    expect((await states()).map(({ state }) => state)).toEqual(expected);
  });
});

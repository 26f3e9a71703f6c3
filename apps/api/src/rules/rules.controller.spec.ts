import { eveningRule } from '../testing/evening';
import { signInAs, type SignedInAgent } from '../testing/people';
import { makeDistrict } from '../testing/places';
import { createTestApp, type TestApp } from '../testing/test-app';

describe('rules', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  let districtId: number;
  beforeAll(async () => {
    test = await createTestApp();
    analyst = await signInAs(test, 'analyst');
    districtId = await makeDistrict(test);
  });
  afterAll(() => test.close());

  const draft = (body: unknown) =>
    analyst.http.post(`/api/districts/${districtId}/rules`).send({ body, note: 'try' });

  it('lists everything a rule may ask about', async () => {
    const { body } = await analyst.http.get('/api/rules/measures').expect(200);
    expect(body).toContainEqual(
      expect.objectContaining({
        name: 'inversionSure',
        kind: 'yes-no',
        ops: ['='],
        label: expect.anything(),
      }),
    );
  });

  it('names each fault of a draft by its field', async () => {
    const wrong = { advisory: { ...eveningRule.advisory, begin: { all: [] } } };
    const { body } = await draft(wrong).expect(422);
    expect(body.code).toBe('rule-not-valid');
    expect(body.errors).toEqual([
      { field: 'body.advisory.begin.all', text: expect.stringContaining('is empty') },
    ]);
  });

  it('refuses a rule whose begin and end can both be true', async () => {
    const { begin } = eveningRule.advisory!;
    const { body } = await draft({ advisory: { begin, end: begin, longestValidityHours: 24 } }).expect(422);
    expect(body.detail).toContain('both true when');
  });

  it('puts one version in force at a time, and never changes it again', async () => {
    const first = (await draft(eveningRule).expect(201)).body;
    expect(first).toMatchObject({ version: 1, state: 'draft', body: eveningRule, note: 'try' });
    expect(first.inWords[0]).toMatchObject({
      kind: 'advisory',
      begin: ['All of these:', expect.any(String), expect.any(String)],
    });
    await analyst.http.post(`/api/rules/${first.id}/put-in-force`).expect(200);
    const second = (await draft(eveningRule).expect(201)).body;
    await analyst.http.post(`/api/rules/${second.id}/put-in-force`).expect(200);
    const again = await analyst.http.post(`/api/rules/${first.id}/put-in-force`).expect(409);
    expect(again.body.code).toBe('not-possible-now');
    const { body } = await analyst.http.get(`/api/districts/${districtId}/rules`).expect(200);
    expect(body.map(({ version, state }: { version: number; state: string }) => [version, state])).toEqual([
      [2, 'in force'],
      [1, 'past'],
    ]);
    expect(body[1].sha256).toBe(first.sha256);
  });
});

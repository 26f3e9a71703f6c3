import { randomUUID } from 'node:crypto';
import { OutboxService } from '../src/outbox/outbox.service';
import { NoticeExpiry } from '../src/notices/notice-expiry';
import { ListImportService } from '../src/subscribers/list-import.service';
import { signInAs, testPassword, type SignedInAgent } from '../src/testing/people';
import { makeDistrict } from '../src/testing/places';
import { createTestApp, type TestApp } from '../src/testing/test-app';

const HOUR_S = 3600;

let test: TestApp;
let district: number;
let officer: SignedInAgent;
let second: SignedInAgent;

beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());

beforeEach(async () => {
  const slug = `mill-flats-${randomUUID().slice(0, 8)}`;
  district = await makeDistrict(test, { slug, name: 'Mill Flats' });
  officer = await signInAs(test, 'officer', { districts: [district] });
  second = await signInAs(test, 'officer', { districts: [district] });
  const people = [1, 2, 3].map((n) => ({
    ...{ lang: n === 1 ? ('es' as const) : ('en' as const), email: `r${n}-${slug}@pellworth.example` },
    ...{ districtSlugs: [slug], kinds: ['advisory' as const, 'burnBan' as const] },
  }));
  await test.app.get(ListImportService, { strict: false }).add(people, 'test');
});

const inHours = (hours: number): string => new Date((test.clock.now() + hours * HOUR_S) * 1000).toISOString();

async function draft(kind: 'advisory' | 'burnBan', by = officer, requestKey: string = randomUUID()) {
  const notice = { districtId: district, kind, expiresAt: inHours(12), reason: 'Smoke lies in the valley.' };
  const { body } = await by.http.post('/api/notices/preview').send(notice).expect(200);
  return { ...notice, previewHash: body.hash as string, requestKey, password: testPassword, preview: body };
}

const issue = ({ preview: _, ...notice }: Awaited<ReturnType<typeof draft>>, by = officer) =>
  by.http.post('/api/notices').send(notice);

const countOf = async (table: string, where = '1'): Promise<number> =>
  (await test.sql.get<{ n: number }>(`SELECT count(*) n FROM ${table} WHERE ${where}`))!.n;

describe('issuing a notice by hand', () => {
  it('sends what was previewed to as many as were named, and keeps event and record', async () => {
    const wanted = await draft('burnBan');
    expect(wanted.preview.recipients).toEqual({ people: 3, emails: 3, texts: 0 });
    expect(wanted.preview.needsPassword).toBe(true);
    const { body } = await issue(wanted).expect(201);
    expect(body.texts).toEqual(wanted.preview.texts);
    expect(body.ref).toBe(wanted.preview.ref);
    expect(body.events).toMatchObject([{ seq: 1, kind: 'issued', by: officer.name }]);
    const sent = body.delivery.reduce((sum: number, each: { count: number }) => sum + each.count, 0);
    expect(sent).toBe(3);
    expect(await countOf('activity', `subject = 'notice ${body.id}'`)).toBe(1);
    const languages = await test.sql.all<{ lang: string }>(
      `SELECT p.lang FROM outbox o JOIN payload p ON p.id = o.payload_id WHERE o.topic = 'notice:${body.id}' ORDER BY 1`,
    );
    expect(languages.map(({ lang }) => lang)).toEqual(['en', 'en', 'es']);
  });

  it('does nothing twice on a double click', async () => {
    const wanted = await draft('advisory');
    const [one, two] = await Promise.all([issue(wanted), issue(wanted)]);
    expect([one.status, two.status]).toEqual([201, 201]);
    expect(two.body.id).toBe(one.body.id);
    expect(await countOf('outbox', `topic = 'notice:${one.body.id}'`)).toBe(3);
  });

  it('tells the second of two officers what the first did', async () => {
    const [mine, theirs] = [await draft('advisory'), await draft('advisory', second)];
    await issue(mine).expect(201);
    const { body } = await issue(theirs, second).expect(409);
    expect(body.code).toBe('already-done');
    expect(body.detail).toContain(officer.name);
    expect(await countOf('notice', `district_id = ${district}`)).toBe(1);
  });

  it('refuses a burn ban without the password, with a wrong one, and words that were not seen', async () => {
    const wanted = await draft('burnBan');
    const without = await issue({ ...wanted, password: '' }).expect(403);
    expect(without.body.code).toBe('password-needed');
    const wrong = await issue({ ...wanted, password: 'not this one at all' }).expect(403);
    expect(wrong.body.code).toBe('password-wrong');
    const other = await issue({ ...wanted, previewHash: 'other' }).expect(409);
    expect(other.body.code).toBe('preview-out-of-date');
    expect(await countOf('notice', `district_id = ${district}`)).toBe(0);
  });

  it('leaves nothing behind when a part of the transaction breaks', async () => {
    const wanted = await draft('advisory');
    const outbox = test.app.get(OutboxService, { strict: false });
    const broken = jest.spyOn(outbox, 'enqueueMany').mockRejectedValueOnce(new Error('broken on purpose'));
    await issue(wanted).expect(500);
    broken.mockRestore();
    expect(await countOf('notice', `district_id = ${district}`)).toBe(0);
    expect(await countOf('notice_event', `request_key = '${wanted.requestKey}'`)).toBe(0);
    await issue(wanted).expect(201);
  });

  it('is not for other districts, other roles or impossible ends', async () => {
    const elsewhere = await signInAs(test, 'officer', { districts: [await makeDistrict(test)] });
    const notice = { districtId: district, kind: 'advisory', expiresAt: inHours(12), reason: 'Smoke again.' };
    await elsewhere.http.post('/api/notices/preview').send(notice).expect(403);
    const analyst = await signInAs(test, 'analyst');
    await analyst.http.post('/api/notices/preview').send(notice).expect(403);
    for (const expiresAt of [inHours(-1), inHours(24 * 8)])
      await officer.http
        .post('/api/notices/preview')
        .send({ ...notice, expiresAt })
        .expect(422);
  });
});

describe('the life of a notice', () => {
  it('ends by an officer with the password again, and sends nothing more of the beginning', async () => {
    const { body: notice } = await issue(await draft('burnBan')).expect(201);
    await test.sql.run(`UPDATE outbox SET state = 'queued' WHERE topic = 'notice:${notice.id}'`);
    const { body: preview } = await officer.http.post(`/api/notices/${notice.id}/end-preview`).expect(200);
    const ending = {
      ...{ previewHash: preview.hash, version: notice.version, reason: 'The lid has broken.' },
      ...{ requestKey: randomUUID(), password: testPassword },
    };
    const { body: ended } = await officer.http.post(`/api/notices/${notice.id}/end`).send(ending).expect(200);
    expect(ended).toMatchObject({ state: 'ended', endedBy: officer.name, endReason: 'The lid has broken.' });
    const states = await test.sql.all<{ revision: number; state: string }>(
      `SELECT DISTINCT revision, state FROM outbox WHERE topic = 'notice:${notice.id}' AND revision = 1`,
    );
    expect(states).toEqual([{ revision: 1, state: 'suppressed' }]);
    const again = await second.http
      .post(`/api/notices/${notice.id}/end`)
      .send({ ...ending, requestKey: randomUUID() })
      .expect(409);
    expect(again.body).toMatchObject({ code: 'already-done', by: officer.name });
  });

  it('gives way to a burn ban as an advisory, and not the other way round', async () => {
    const { body: advisory } = await issue(await draft('advisory')).expect(201);
    await issue(await draft('burnBan')).expect(201);
    const { body: replaced } = await officer.http.get(`/api/notices/${advisory.id}`).expect(200);
    expect(replaced.state).toBe('replaced');
    await issue(await draft('advisory')).expect(409);
  });

  it('comes to its written end by itself', async () => {
    const { body: notice } = await issue(await draft('advisory')).expect(201);
    test.clock.set(test.clock.now() + 13 * HOUR_S);
    await test.app.get(NoticeExpiry, { strict: false }).closeDue();
    officer = await signInAs(test, 'officer', { districts: [district] });
    const { body } = await officer.http.get(`/api/notices/${notice.id}`).expect(200);
    expect(body.state).toBe('ended');
    expect(Date.parse(body.endedAt as string)).toBe(Date.parse(notice.expiresAt as string));
    expect(body.endedBy).toBeUndefined();
    expect(body.events.at(-1)).toMatchObject({ kind: 'expired', by: 'the service' });
  });

  it('cannot be rewritten: its events refuse change and removal', async () => {
    const { body: notice } = await issue(await draft('advisory')).expect(201);
    const where = `WHERE notice_id = ${notice.id}`;
    const refusal = { parent: { message: expect.stringContaining('append-only') as string } };
    await expect(test.sql.run(`UPDATE notice_event SET body = '{}' ${where}`)).rejects.toMatchObject(refusal);
    await expect(test.sql.run(`DELETE FROM notice_event ${where}`)).rejects.toMatchObject(refusal);
  });
});

describe('the notice log', () => {
  it('filters, searches and pages, newest first', async () => {
    const { body: notice } = await issue(await draft('burnBan')).expect(201);
    const find = async (query: string) =>
      (await officer.http.get(`/api/notices?districtId=${district}&${query}`).expect(200)).body;
    expect(await find('kind=burnBan&state=in force')).toMatchObject({ total: 1, items: [{ id: notice.id }] });
    expect(await find('kind=advisory')).toMatchObject({ total: 0 });
    expect(await find(`q=${notice.ref}`)).toMatchObject({ total: 1 });
    expect(await find('q=nothing like this')).toMatchObject({ total: 0 });
    expect(await find(`from=${inHours(1)}`)).toMatchObject({ total: 0 });
    await officer.http.get('/api/notices?from=yesterday').expect(422);
  });

  it('shows who got it with masked addresses, to those who may see', async () => {
    const { body: notice } = await issue(await draft('advisory')).expect(201);
    const { body } = await officer.http.get(`/api/notices/${notice.id}/deliveries?pageSize=2`).expect(200);
    expect(body).toMatchObject({ total: 3, page: 1, pageSize: 2 });
    expect(body.items[0].to).toMatch(/^r…@/);
    const elsewhere = await signInAs(test, 'officer', { districts: [await makeDistrict(test)] });
    await elsewhere.http.get(`/api/notices/${notice.id}/deliveries`).expect(403);
  });
});

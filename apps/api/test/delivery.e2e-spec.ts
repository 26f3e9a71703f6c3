import { randomUUID } from 'node:crypto';
import { SetClock } from '../src/common/clock';
import { OutboxDispatcher } from '../src/outbox/outbox-dispatcher';
import { OutboxService } from '../src/outbox/outbox.service';
import { ListImportService } from '../src/subscribers/list-import.service';
import { signInAs } from '../src/testing/people';
import { makeDistrict } from '../src/testing/places';
import { createTestApp, type TestApp } from '../src/testing/test-app';
import { freePort, smsAccount, startLocalServices, until, type LocalServices } from './local-services';

interface Mail {
  to: string[];
  subject: string;
  headers: Record<string, string>;
}
interface Text {
  to: string;
  body: string;
}

jest.setTimeout(60_000);

let test: TestApp;
let local: LocalServices;
let publicUrl: string;

beforeAll(async () => {
  const port = await freePort();
  publicUrl = `http://127.0.0.1:${port}`;
  local = await startLocalServices(publicUrl);
  test = await createTestApp({
    clock: new SetClock(Math.floor(Date.now() / 1000)),
    settings: {
      publicUrl,
      smtp: {
        host: '127.0.0.1',
        port: local.smtpPort,
        secure: false,
        from: 'Office <notices@pellworth.example>',
      },
      sms: { ...smsAccount, baseUrl: local.smsUrl },
    },
  });
  await test.app.listen(port, '127.0.0.1');
}, 60_000);
afterAll(async () => {
  await test.close();
  await local.stop();
});

let phones = 100;
const nextPhone = (): string => `+1208555${String(++phones).padStart(4, '0')}`;

async function issueTo(people: { email?: string; phone?: string }[]): Promise<number> {
  const slug = `north-${randomUUID().slice(0, 8)}`;
  const district = await makeDistrict(test, { slug, name: 'Northgate' });
  const listed = people.map((each) => ({
    ...{ lang: 'en' as const, districtSlugs: [slug], kinds: ['advisory' as const] },
    ...each,
  }));
  await test.app.get(ListImportService, { strict: false }).add(listed, 'test');
  const officer = await signInAs(test, 'officer', { districts: [district] });
  const expiresAt = new Date((test.clock.now() + 6 * 3600) * 1000).toISOString();
  const notice = { districtId: district, kind: 'advisory', expiresAt, reason: 'Smoke in the valley.' };
  const { body: preview } = await officer.http.post('/api/notices/preview').send(notice).expect(200);
  const { body } = await officer.http
    .post('/api/notices')
    .send({ ...notice, previewHash: preview.hash, requestKey: randomUUID() })
    .expect(201);
  return body.id as number;
}

interface Row {
  id: number;
  state: string;
  attempts: number;
  detail: string | null;
}
const rowsOf = (noticeId: number): Promise<Row[]> =>
  test.sql.all<Row>(
    `SELECT id, state, attempts, detail FROM outbox WHERE topic = 'notice:${noticeId}' ORDER BY channel`,
  );
const settled = (noticeId: number, state: string): Promise<Row[]> =>
  until(
    () => rowsOf(noticeId),
    (rows) => rows.length > 0 && rows.every((row) => row.state === state),
  );

/** Lets the time of the next attempt come, and makes it. */
async function later(): Promise<void> {
  test.clock.set(test.clock.now() + 40 * 60);
  await test.app.get(OutboxDispatcher, { strict: false }).dispatch();
}

describe('sending a notice', () => {
  it('reaches mailbox and telephone; a text counts as delivered only by the signed call-back', async () => {
    const [email, phone] = ['ada@pellworth.example', nextPhone()];
    const id = await issueTo([{ email }, { phone }]);
    const rows = await until(
      () => rowsOf(id),
      ([mail, text]) => mail?.state === 'accepted' && text?.state === 'delivered',
    );
    expect(rows).toHaveLength(2);
    const { items: mails } = await local.get<{ items: Mail[] }>(`/api/mail?to=${email}`);
    expect(mails).toHaveLength(1);
    expect(mails[0]!.subject).toContain('Advisory in Northgate');
    const { items: texts } = await local.get<{ items: Text[] }>(`/api/sms?to=${encodeURIComponent(phone)}`);
    expect(texts).toHaveLength(1);
    expect(texts[0]!.body).toContain('advisory for Northgate');
  });

  it('tries again after a 4xx answer and a 5xx of the provider, and gives up on final ones', async () => {
    await local.order('/control/mail', { mode: 'error' });
    await local.order('/control/sms', { mode: 'error' });
    const id = await issueTo([{ email: 'later@pellworth.example' }, { phone: nextPhone() }]);
    const waiting = await until(
      () => rowsOf(id),
      (rows) => rows.every(({ state, attempts }) => state === 'queued' && attempts === 1),
    );
    expect(waiting.every(({ detail }) => detail !== null)).toBe(true);
    await local.order('/control/mail', { mode: 'ok' });
    await local.order('/control/sms', { mode: 'ok' });
    await later();
    await until(
      () => rowsOf(id),
      ([mail, text]) => mail?.state === 'accepted' && text?.state === 'delivered',
    );
    await local.order('/control/mail', { mode: 'refuse' });
    const refused = await issueTo([{ email: 'never@pellworth.example' }]);
    const [row] = await settled(refused, 'failed');
    expect(row).toMatchObject({ attempts: 1 });
    await local.order('/control/mail', { mode: 'ok' });
  });

  it('sends no text again that the provider took before the connection broke', async () => {
    await local.order('/control/sms', { mode: 'drop', times: 1 });
    const phone = nextPhone();
    const id = await issueTo([{ phone }]);
    await until(
      () => rowsOf(id),
      ([row]) => row?.state === 'delivered',
    );
    await later();
    expect((await local.get<{ total: number }>(`/api/sms?to=${encodeURIComponent(phone)}`)).total).toBe(1);
  });

  it('asks the provider before it sends a text again whose report has not come', async () => {
    await local.order('/control/sms', { mode: 'drop', times: 1, statusDelayMs: 600_000 });
    const phone = nextPhone();
    const id = await issueTo([{ phone }]);
    await until(
      () => rowsOf(id),
      ([row]) => row?.state === 'queued' && row.attempts === 1,
    );
    await later();
    await settled(id, 'accepted');
    expect((await local.get<{ total: number }>(`/api/sms?to=${encodeURIComponent(phone)}`)).total).toBe(1);
    await local.order('/control/sms', { statusDelayMs: 1 });
  });

  it('keeps trying where the fault is ours and not the recipient’s', async () => {
    const phone = nextPhone();
    await local.order('/control/sms', { mode: 'tooMany', times: 1 });
    await local.order('/control/sms', { numbers: { [phone]: { refuseCode: 21606 } } });
    const id = await issueTo([{ phone }]);
    const tried = (attempts: number) =>
      until(
        () => rowsOf(id),
        ([row]) => row?.state === 'queued' && row.attempts === attempts,
      );
    await tried(1);
    await later();
    await tried(2);
    await local.order('/control/sms', { numbers: {} });
    await later();
    await settled(id, 'delivered');
  });

  it.each([
    [21610, 'the recipient texted STOP'],
    [21211, 'the number does not exist'],
  ])('writes to no number again that the provider refuses with %i', async (refuseCode, reason) => {
    const phone = nextPhone();
    await local.order('/control/sms', { numbers: { [phone]: { refuseCode } } });
    await settled(await issueTo([{ phone }]), 'failed');
    await local.order('/control/sms', { numbers: {} });
    const contact = await test.sql.get('SELECT stop_reason FROM contact WHERE address = $1', [phone]);
    expect(contact).toEqual({ stop_reason: reason });
  });

  it('does not send what waits once its notice has ended', async () => {
    await local.order('/control/mail', { mode: 'error' });
    const email = 'ended@pellworth.example';
    const id = await issueTo([{ email }]);
    await until(
      () => rowsOf(id),
      ([row]) => row?.state === 'queued' && row.attempts === 1,
    );
    const outbox = test.app.get(OutboxService, { strict: false });
    // What is under way cannot be called back; only a later attempt can be left out.
    await test.sql.run("UPDATE outbox SET state = 'sending' WHERE topic = $1", [`notice:${id}`]);
    await outbox.suppressQueued(`notice:${id}`, 99, 'the notice is no longer in force');
    await test.sql.run("UPDATE outbox SET state = 'queued' WHERE topic = $1", [`notice:${id}`]);
    await local.order('/control/mail', { mode: 'ok' });
    await later();
    await settled(id, 'suppressed');
    expect((await local.get<{ total: number }>(`/api/mail?to=${email}`)).total).toBe(0);
  });

  it('takes no unsigned or wrongly signed report', async () => {
    const form = 'MessageSid=SM1&MessageStatus=delivered';
    await test.http.post('/api/hooks/sms/status?message=x').send(form).expect(403);
    await test.http
      .post('/api/hooks/sms/status?message=x')
      .set('X-Twilio-Signature', 'bm90IHRoaXMgb25l')
      .send(form)
      .expect(403);
  });
});

describe('what residents do', () => {
  it('subscribe on the page, confirm by the link in mail and text, and leave by one click', async () => {
    const slug = `upper-${randomUUID().slice(0, 8)}`;
    await makeDistrict(test, { slug, name: 'Upper Tarn' });
    const [email, phone] = [`new-${slug}@pellworth.example`, nextPhone()];
    const wishes = { lang: 'en', districtSlugs: [slug], kinds: ['burnBan'] };
    const first = await test.http
      .post('/api/public/subscriptions')
      .send({ ...wishes, email, phone })
      .expect(202);
    const { items } = await until(
      () => local.get<{ items: (Mail & { text: string })[] }>(`/api/mail?to=${email}`),
      (found) => found.items.length === 1,
    );
    const token = /\/s\/confirm\/(\S+)/.exec(items[0]!.text)![1]!;
    const { body: confirmed } = await test.http
      .post('/api/public/subscriptions/confirm')
      .send({ token })
      .expect(200);
    const own = `/api/public/subscriptions/${confirmed.manageToken}`;
    const { body: view } = await test.http.get(own).expect(200);
    expect(view).toMatchObject({ ...wishes, contacts: [{ confirmed: true }, { confirmed: false }] });
    expect(JSON.stringify(view)).not.toContain(email);
    const again = await test.http
      .post('/api/public/subscriptions')
      .send({ ...wishes, email, phone })
      .expect(202);
    expect(again.body).toEqual(first.body);
    await test.http.get(`${own}/leave`).expect(404);
    await test.http.post(`${own}/leave`).type('form').send('List-Unsubscribe=One-Click').expect(204);
    await test.http.post(`${own}/leave`).expect(204);
    await test.http.get(own).expect(410);
    const kept = await test.sql.get<{ n: number }>(
      'SELECT count(*) n FROM contact WHERE address IN ($1, $2)',
      [email, phone],
    );
    expect(kept!.n).toBe(0);
  });

  it('stop and come back by texting a word', async () => {
    const phone = nextPhone();
    await issueTo([{ phone }]);
    const stopped = (): Promise<{ at: number | null } | undefined> =>
      test.sql.get<{ at: number | null }>('SELECT stopped_at at FROM contact WHERE address = $1', [phone]);
    await local.order('/control/sms/incoming', { from: phone, body: 'Stop.' });
    expect((await stopped())!.at).not.toBeNull();
    await local.order('/control/sms/incoming', { from: phone, body: 'start' });
    expect((await stopped())!.at).toBeNull();
  });

  it.each([
    [{ phone: '12' }, 'phone'],
    [{ email: 'not an address' }, 'email'],
    [{}, 'email'],
  ])('are told beside the field what cannot be read in %j', async (address, field) => {
    const slug = `field-${randomUUID().slice(0, 8)}`;
    await makeDistrict(test, { slug });
    const { body } = await test.http
      .post('/api/public/subscriptions')
      .send({ lang: 'en', districtSlugs: [slug], kinds: ['advisory'], ...address })
      .expect(422);
    expect(body.errors[0].field).toBe(field);
  });
});

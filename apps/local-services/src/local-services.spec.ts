import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, request, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createTransport } from 'nodemailer';
import twilio from 'twilio';
import { startLocalServices, type LocalServices } from './local-services';
import { readSettings } from './settings';

const ACCOUNT = 'AC0123456789abcdef0123456789abcdef';
const TOKEN = 'a-token-for-the-test';

/** The official client, its requests turned towards the stand-in. */
const clientFor = (port: number, token = TOKEN) => {
  class Turned extends twilio.RequestClient {
    override request<T>(options: Parameters<twilio.RequestClient['request']>[0]) {
      const { pathname, search } = new URL(options.uri);
      return super.request<T>({ ...options, uri: `http://127.0.0.1:${port}${pathname}${search}` } as never);
    }
  }
  return twilio(ACCOUNT, token, { httpClient: new Turned() as never });
};

describe('local services', () => {
  let stateDir: string;
  let services: LocalServices;
  let hook: Server;
  let hookUrl: string;
  const heard: { url: string; signed: boolean; form: Record<string, string> }[] = [];
  const waiting: (() => void)[] = [];

  const start = () =>
    startLocalServices({
      ...readSettings({
        STATE_DIR: stateDir,
        SMS_ACCOUNT_SID: ACCOUNT,
        SMS_AUTH_TOKEN: TOKEN,
        SMS_STATUS_DELAY_MS: '1',
      }),
      pagePort: 0,
      smtpPort: 0,
      smsPort: 0,
      smsUndeliveredShare: 0,
      smsIncomingUrl: `${hookUrl}/incoming`,
    });
  const page = (route: string, init?: RequestInit) =>
    fetch(`http://127.0.0.1:${services.pagePort}${route}`, init);
  const json = async (route: string) => (await page(route)).json() as Promise<any>;
  const tell = async (route: string, body: unknown) => {
    const answer = await page(route, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(body),
    });
    return { status: answer.status, body: (await answer.json()) as any };
  };
  const until = async (holds: () => boolean) => {
    while (!holds()) await new Promise<void>((resolve) => waiting.push(resolve));
  };
  const mailer = () =>
    createTransport({ host: '127.0.0.1', port: services.smtpPort, secure: false, ignoreTLS: true });
  const letter = (to: string, messageId = '<one@pellworth.example>') => ({
    from: 'Office <air@pellworth.example>',
    to,
    subject: 'Prohibición ñ',
    text: 'See http://127.0.0.1/s/x',
    html: '<p>Hello</p><script>alert(1)</script>',
    messageId,
  });

  beforeAll(async () => {
    stateDir = await mkdtemp(path.join(tmpdir(), 'local-services-'));
    hook = createServer((incoming, response) => {
      let body = '';
      incoming.on('data', (chunk) => (body += chunk));
      incoming.on('end', () => {
        const form = Object.fromEntries(new URLSearchParams(body));
        const signed = twilio.validateRequest(
          TOKEN,
          String(incoming.headers['x-twilio-signature']),
          hookUrl + incoming.url,
          form,
        );
        heard.push({ url: incoming.url!, signed, form });
        response.setHeader('content-type', 'text/xml');
        response.end(
          incoming.url === '/incoming'
            ? '<Response><Message>You have left &amp; hear no more.</Message></Response>'
            : '',
        );
        waiting.splice(0).forEach((wake) => wake());
      });
    });
    await new Promise<void>((resolve) => hook.listen(0, '127.0.0.1', resolve));
    hookUrl = `http://127.0.0.1:${(hook.address() as AddressInfo).port}`;
    services = await start();
  });
  afterAll(async () => {
    await services.close();
    hook.closeAllConnections();
    await new Promise((resolve) => hook.close(resolve));
    await rm(stateDir, { recursive: true });
  });
  afterEach(async () => {
    await tell('/control/mail', { mode: 'ok', recipients: {} });
    await tell('/control/sms', { mode: 'ok', numbers: {} });
  });

  it('keeps mail and shows it, to people and to programs', async () => {
    await mailer().sendMail({
      ...letter('resident@example.org'),
      list: { unsubscribe: { url: 'https://pellworth.example/s/x', comment: '' } },
      headers: { 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' },
    });
    const { items, total } = await json('/api/mail?to=Resident@example.org');
    expect(total).toBe(1);
    expect(items[0]).toMatchObject({
      to: ['resident@example.org'],
      messageId: '<one@pellworth.example>',
      subject: 'Prohibición ñ',
    });
    expect(items[0].headers).toContainEqual({
      key: 'list-unsubscribe-post',
      line: 'List-Unsubscribe-Post: List-Unsubscribe=One-Click',
    });
    expect(await (await page('/')).text()).toContain('Prohibición ñ');
    const opened = await (await page(`/mail/${items[0].n}`)).text();
    expect(opened).toContain('&lt;script&gt;alert(1)');
    expect(opened).not.toContain('<script>');
    expect((await page('/mail/999')).status).toBe(404);
  });

  it.each([
    [{ mode: 'refuse' }, 550],
    [{ mode: 'error' }, 451],
    [{ recipients: { 'gone@example.org': 550 } }, 550],
    [{ recipients: { 'gone@example.org': 452 } }, 452],
  ])('refuses mail as told: %j', async (order, responseCode) => {
    const { total } = await json('/api/mail?brief=1');
    await tell('/control/mail', order);
    await expect(mailer().sendMail(letter('gone@example.org'))).rejects.toMatchObject({ responseCode });
    expect((await json('/api/mail?brief=1')).total).toBe(total);
  });

  it('breaks the connection after it has kept the mail, as many times as told', async () => {
    await tell('/control/mail', { mode: 'drop', times: 1 });
    await expect(mailer().sendMail(letter('drop@example.org', '<d@pellworth.example>'))).rejects.toThrow();
    expect((await json('/api/mail?brief=1&to=drop@example.org')).total).toBe(1);
    await mailer().sendMail(letter('drop@example.org', '<d@pellworth.example>'));
    const { items } = await json('/api/mail?brief=1&to=drop@example.org');
    expect(items.map((item: any) => item.messageId)).toEqual([
      '<d@pellworth.example>',
      '<d@pellworth.example>',
    ]);
  });

  it('speaks with the official client and calls back, signed, up to delivered', async () => {
    const sent = await clientFor(services.smsPort).messages.create({
      to: '+12085550111',
      messagingServiceSid: 'MG0123456789abcdef0123456789abcdef',
      body: 'MF-26-001: no burning',
      statusCallback: `${hookUrl}/status`,
    });
    expect(sent).toMatchObject({ status: 'accepted', to: '+12085550111', numSegments: '1' });
    const steps = () => heard.filter(({ form }) => form.MessageSid === sent.sid);
    await until(() => steps().length === 3);
    expect(steps().map(({ form }) => form.MessageStatus)).toEqual(['queued', 'sent', 'delivered']);
    expect(steps().every(({ signed, url }) => signed && url === '/status')).toBe(true);
    const fetched = await clientFor(services.smsPort).messages(sent.sid).fetch();
    expect(fetched).toMatchObject({ status: 'delivered', body: 'MF-26-001: no burning' });
    expect(fetched.dateSent!.getTime()).toBeLessThanOrEqual(Date.now() + 1000);
  });

  it('lists by recipient and date, page by page', async () => {
    const client = clientFor(services.smsPort);
    for (let n = 1; n <= 5; n++)
      await client.messages.create({ to: '+12085550112', from: '+12085550100', body: `number ${n}` });
    const yesterday = new Date(Date.now() - 86_400_000);
    const list = await client.messages.list({ to: '+12085550112', dateSentAfter: yesterday, pageSize: 2 });
    expect(list.map(({ body }) => body)).toEqual([5, 4, 3, 2, 1].map((n) => `number ${n}`));
    expect(await client.messages.list({ to: '+12085550112', dateSentBefore: yesterday })).toEqual([]);
  });

  it.each([
    ['a wrong number', { to: '555' }, {}, 400, 21211],
    ['no sender', { from: undefined }, {}, 400, 21603],
    ['an empty body', { body: '' }, {}, 400, 21602],
    ['a number that opted out', {}, { numbers: { '+12085550113': { refuseCode: 21610 } } }, 400, 21610],
    ['out of order', {}, { mode: 'error' }, 500, 20500],
    ['too many', {}, { mode: 'tooMany' }, 429, 20429],
  ])('refuses %s as the provider does', async (_, changed, order, status, code) => {
    await tell('/control/sms', order);
    const asked = clientFor(services.smsPort).messages.create({
      to: '+12085550113',
      from: '+12085550100',
      body: 'x',
      ...changed,
    });
    await expect(asked).rejects.toMatchObject({ status, code });
  });

  it('refuses a wrong token and an unknown text', async () => {
    await expect(clientFor(services.smsPort, 'wrong').messages.list({ limit: 1 })).rejects.toMatchObject({
      status: 401,
      code: 20003,
    });
    await expect(
      clientFor(services.smsPort)
        .messages('SM' + '0'.repeat(32))
        .fetch(),
    ).rejects.toMatchObject({ status: 404, code: 20404 });
  });

  it('lets a number fail at the end', async () => {
    await tell('/control/sms', { numbers: { '+12085550114': { end: 'undelivered', errorCode: 30006 } } });
    const { sid } = await clientFor(services.smsPort).messages.create({
      to: '+12085550114',
      from: '+12085550100',
      body: 'x',
      statusCallback: `${hookUrl}/status`,
    });
    const last = () =>
      heard.find(({ form }) => form.MessageSid === sid && form.MessageStatus === 'undelivered');
    await until(() => last() !== undefined);
    expect(last()!.form.ErrorCode).toBe('30006');
  });

  it("brings in a resident's text, signed, and sends the answer back", async () => {
    const { body } = await tell('/control/sms/incoming', { from: '+12085550115', body: 'STOP' });
    expect(body.replies).toEqual(['You have left & hear no more.']);
    expect(heard.find(({ url }) => url === '/incoming')).toMatchObject({
      signed: true,
      form: { From: '+12085550115', Body: 'STOP' },
    });
    expect((await json('/api/sms?to=%2B12085550115')).items[0]).toMatchObject({
      direction: 'outbound-reply',
    });
    expect(await (await page('/?show=texts')).text()).toContain('You have left &amp; hear no more.');
  });

  it('refuses a stranger’s host name, a form, and an order it does not know', async () => {
    const status = await new Promise((resolve, reject) =>
      request({ port: services.pagePort, host: '127.0.0.1', headers: { host: 'evil.example' } }, (answer) => {
        answer.resume();
        resolve(answer.statusCode);
      })
        .on('error', reject)
        .end(),
    );
    expect(status).toBe(421);
    expect(
      (await page('/control/mail', { method: 'POST', body: new URLSearchParams({ mode: 'refuse' }) })).status,
    ).toBe(400);
    expect(await tell('/control/mail', { mode: 'explode' })).toMatchObject({
      status: 400,
      body: { error: expect.stringContaining('one of ok') },
    });
    expect(await tell('/control/sms', { speed: 1 })).toMatchObject({ status: 400 });
  });

  it('still has everything after it was stopped and started again', async () => {
    const [mail, texts] = [(await json('/api/mail?brief=1')).total, (await json('/api/sms')).total];
    await services.close();
    services = await start();
    expect([(await json('/api/mail?brief=1')).total, (await json('/api/sms')).total]).toEqual([mail, texts]);
    expect(mail).toBeGreaterThan(0);
    expect(texts).toBeGreaterThan(0);
  });
});

describe('settings', () => {
  it.each([
    [{ NODE_ENV: 'production' }, 'refuse to start'],
    [{ LOCAL_SMTP_PORT: 'x' }, 'LOCAL_SMTP_PORT is "x"'],
    [{ SMS_UNDELIVERED_SHARE: '3' }, 'from 0 to 1'],
  ])('%j is refused in a sentence', (env, words) => expect(() => readSettings(env)).toThrow(words));
});

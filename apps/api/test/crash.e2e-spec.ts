import { spawn, type ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import path from 'node:path';
import { SetClock } from '../src/common/clock';
import { OutboxDispatcher } from '../src/outbox/outbox-dispatcher';
import { ListImportService } from '../src/subscribers/list-import.service';
import { signInAs } from '../src/testing/people';
import { makeDistrict } from '../src/testing/places';
import { temporaryFolder } from '../src/testing/temporary-folder';
import { createTestApp } from '../src/testing/test-app';
import { freePort, smsAccount, startLocalServices, until, type LocalServices } from './local-services';

jest.setTimeout(120_000);

const EACH = 500;
const KILL_AFTER = 50;
const built = path.resolve(__dirname, '../dist/main.js');
const data = temporaryFolder();

let local: LocalServices;
let publicUrl: string;

beforeAll(async () => {
  publicUrl = `http://127.0.0.1:${await freePort()}`;
  local = await startLocalServices(publicUrl);
});
afterAll(async () => {
  await local.stop();
  data.remove();
});

/** Issues one notice to 500 mailboxes and 500 telephones, and stops before anything of it was sent. */
async function queueThousand(): Promise<void> {
  const wake = jest.spyOn(OutboxDispatcher.prototype, 'wake').mockImplementation(() => undefined);
  const test = await createTestApp({
    dataDir: data.folder,
    clock: new SetClock(Math.floor(Date.now() / 1000)),
    settings: { publicUrl },
  });
  const district = await makeDistrict(test, { slug: 'mill-flats', name: 'Mill Flats' });
  const people = Array.from({ length: EACH }, (_, n) => String(n).padStart(4, '0')).flatMap((n) => [
    { email: `r${n}@pellworth.example` },
    { phone: `+1208555${n}` },
  ]);
  const wishes = { lang: 'en' as const, districtSlugs: ['mill-flats'], kinds: ['advisory' as const] };
  await test.app.get(ListImportService, { strict: false }).add(
    people.map((each) => ({ ...wishes, ...each })),
    'test',
  );
  const officer = await signInAs(test, 'officer', { districts: [district] });
  const expiresAt = new Date((test.clock.now() + 6 * 3600) * 1000).toISOString();
  const notice = { districtId: district, kind: 'advisory', expiresAt, reason: 'Smoke in the valley.' };
  const { body: preview } = await officer.http.post('/api/notices/preview').send(notice).expect(200);
  await officer.http
    .post('/api/notices')
    .send({ ...notice, previewHash: preview.hash, requestKey: randomUUID() })
    .expect(201);
  await test.close();
  wake.mockRestore();
}

function startService(): ChildProcess {
  return spawn(process.execPath, [built], {
    env: {
      PATH: process.env.PATH,
      ...{
        DEMO: 'off',
        DATA_DIR: data.folder,
        PUBLIC_URL: publicUrl,
        PORT: new URL(publicUrl).port,
        LOG_LEVEL: 'error',
      },
      ...{ SMTP_HOST: '127.0.0.1', SMTP_PORT: String(local.smtpPort), SMS_BASE_URL: local.smsUrl },
      ...{
        SMS_ACCOUNT_SID: smsAccount.accountSid,
        SMS_AUTH_TOKEN: smsAccount.authToken,
        SMS_FROM: smsAccount.from,
      },
    },
    stdio: ['ignore', 'ignore', 'inherit'],
  });
}

const arrived = async () => ({
  mails: (await local.get<{ total: number }>('/api/mail?brief=1&pageSize=1')).total,
  texts: (await local.get<{ total: number }>('/api/sms?pageSize=1')).total,
});

async function all<T>(url: string): Promise<T[]> {
  const items: T[] = [];
  for (let page = 1; ; page += 1) {
    const found = await local.get<{ items: T[]; total: number }>(`${url}?page=${page}&pageSize=200`);
    items.push(...found.items);
    if (found.items.length === 0 || items.length >= found.total) return items;
  }
}

it('loses no message and sends no text twice when the process is killed in the middle', async () => {
  await queueThousand();
  await local.order('/control/sms', { mode: 'slow', delayMs: 30 });
  await local.order('/control/mail', { mode: 'slow', delayMs: 30 });
  const first = startService();
  const atKill = await until(arrived, ({ mails, texts }) => mails + texts >= KILL_AFTER, 30_000);
  first.kill('SIGKILL');
  await once(first, 'close');
  expect(atKill.mails + atKill.texts).toBeLessThan(2 * EACH);

  const second = startService();
  await until(arrived, ({ mails, texts }) => texts >= EACH && mails >= EACH, 60_000);
  await until(
    () => fetch(`${publicUrl}/health/ready`).then(({ status }) => status),
    (status) => status === 200,
  );
  second.kill('SIGTERM');
  await once(second, 'close');

  const texts = await all<{ to: string }>('/api/sms');
  expect(texts).toHaveLength(EACH);
  expect(new Set(texts.map(({ to }) => to)).size).toBe(EACH);
  const mails = await all<{ headers: { key: string; line: string }[] }>('/api/mail');
  const idOf = ({ headers }: (typeof mails)[number]) => headers.find(({ key }) => key === 'message-id')?.line;
  expect(new Set(mails.map(idOf)).size).toBe(EACH);
});

import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { createServer, type AddressInfo } from 'node:net';
import path from 'node:path';
import { temporaryFolder } from '../src/testing/temporary-folder';

const built = path.resolve(__dirname, '../../local-services/dist/main.js');

/** The account the stand-in and the service share in tests. */
export const smsAccount = {
  accountSid: `AC${'7'.repeat(32)}`,
  authToken: 'test-auth-token',
  from: '+12085550100',
};

/** The running stand-ins: a mail server and a text-message provider in another process. */
export interface LocalServices {
  smtpPort: number;
  smsUrl: string;
  /** JSON of the page's API. */
  get: <T>(path: string) => Promise<T>;
  /** Gives an order. */
  order: (path: string, body: object) => Promise<unknown>;
  stop: () => Promise<void>;
}

/** A port that is free now. */
export async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address() as AddressInfo;
  server.close();
  return port;
}

/** Starts the built stand-ins on free ports; `publicUrl` is where incoming texts are posted. */
export async function startLocalServices(publicUrl: string): Promise<LocalServices> {
  const { folder, remove } = temporaryFolder();
  const child = spawn(process.execPath, [built], {
    env: {
      PATH: process.env.PATH,
      ...{ LOCAL_PAGE_PORT: '0', LOCAL_SMTP_PORT: '0', LOCAL_SMS_PORT: '0' },
      ...{ STATE_DIR: folder, LOGGER_DIR: path.join(folder, 'loggers') },
      ...{
        SMS_ACCOUNT_SID: smsAccount.accountSid,
        SMS_AUTH_TOKEN: smsAccount.authToken,
        SMS_FROM: smsAccount.from,
      },
      ...{
        SMS_INCOMING_URL: `${publicUrl}/api/hooks/sms/incoming`,
        SMS_STATUS_DELAY_MS: '20',
        SMS_UNDELIVERED_SHARE: '0',
      },
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const [, page, smtp, sms] = await portsOf(child);
  const pageUrl = `http://127.0.0.1:${page}`;
  return {
    smtpPort: Number(smtp),
    smsUrl: `http://127.0.0.1:${sms}`,
    get: async <T>(url: string) => (await (await fetch(pageUrl + url)).json()) as T,
    order: async (url, body) => {
      const headers = { 'Content-Type': 'application/json' };
      const answer = await fetch(pageUrl + url, { method: 'POST', headers, body: JSON.stringify(body) });
      if (!answer.ok) throw new Error(`The order was refused: ${await answer.text()}`);
      return answer.json();
    },
    stop: async () => {
      child.kill('SIGTERM');
      await once(child, 'close');
      remove();
    },
  };
}

function portsOf(child: ChildProcess): Promise<RegExpExecArray> {
  return new Promise((resolve, reject) => {
    let said = '';
    child.stdout?.on('data', (text: Buffer) => {
      said += text.toString();
      const found =
        /page http:\/\/127\.0\.0\.1:(\d+), mail 127\.0\.0\.1:(\d+), texts http:\/\/127\.0\.0\.1:(\d+)/.exec(
          said,
        );
      if (found) resolve(found);
    });
    child.once('close', () => reject(new Error(`The local services ended before they listened: ${said}`)));
  });
}

/** Asks again and again, at most for so long, until the answer is one to go on with. */
export async function until<T>(
  ask: () => Promise<T>,
  isIt: (answer: T) => boolean,
  withinMs = 10_000,
): Promise<T> {
  const end = Date.now() + withinMs;
  for (;;) {
    const answer = await ask();
    if (isIt(answer)) return answer;
    if (Date.now() > end)
      throw new Error(`It did not come to that within ${withinMs} ms: ${JSON.stringify(answer)}`);
    await new Promise((resolve) => setTimeout(resolve, 15));
  }
}

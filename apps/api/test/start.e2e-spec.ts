import { spawn, type ChildProcess } from 'node:child_process';
import { existsSync } from 'node:fs';
import { createServer, type AddressInfo } from 'node:net';
import { once } from 'node:events';
import path from 'node:path';
import { temporaryFolder } from '../src/testing/temporary-folder';

const main = path.resolve(__dirname, '../dist/main.js');
const { folder, remove } = temporaryFolder();

interface Ended {
  code: number | null;
  stderr: string;
}

function start(environment: Record<string, string>): ChildProcess {
  return spawn(process.execPath, [main], {
    env: {
      PATH: process.env.PATH,
      DEMO: 'off',
      PORT: '0',
      DATA_DIR: path.join(folder, 'data'),
      ...environment,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
}

async function ended(child: ChildProcess): Promise<Ended> {
  let stderr = '';
  child.stderr?.on('data', (text: Buffer) => (stderr += text.toString()));
  const [code] = (await once(child, 'close')) as [number | null];
  return { code, stderr };
}

/** Resolves with the address the service listens at, as its log says. */
function address(child: ChildProcess): Promise<string> {
  return new Promise((resolve, reject) => {
    let log = '';
    child.stdout?.on('data', (text: Buffer) => {
      log += text.toString();
      const found = /Listening at http:\/\/\S+?:(\d+) /.exec(log);
      if (found) resolve(`http://127.0.0.1:${found[1]}`);
    });
    child.once('close', () => reject(new Error(`It ended before it listened: ${log}`)));
  });
}

describe('starting the built service', () => {
  beforeAll(() => {
    if (!existsSync(main)) throw new Error('Build the API first: npm run build.');
  });
  afterAll(remove);

  it('says when it is ready, refuses a second start on its folder, and ends cleanly on a signal', async () => {
    const child = start({});
    const end = ended(child);
    const ready = await fetch(`${await address(child)}/health/ready`);
    expect(await ready.json()).toMatchObject({ status: 'ok' });
    const second = await ended(start({}));
    expect(second).toEqual({
      code: 1,
      stderr: `Lidwatch already runs on the data folder ${path.join(folder, 'data')}: stop it first, or set DATA_DIR to another folder.\n`,
    });
    child.kill('SIGTERM');
    expect(await end).toEqual({ code: null, stderr: '' });
    expect(child.signalCode).toBe('SIGTERM');
    expect(existsSync(path.join(folder, 'data', 'lidwatch.sqlite-wal'))).toBe(false);
  }, 60_000);

  it('says in one sentence that the port is in use', async () => {
    const other = createServer().listen(0);
    await once(other, 'listening');
    const port = (other.address() as AddressInfo).port;
    const { code, stderr } = await ended(start({ PORT: String(port), DATA_DIR: path.join(folder, 'port') }));
    other.close();
    expect({ code, stderr }).toEqual({
      code: 1,
      stderr: `Port ${port} is in use: stop what listens there, or set PORT to another one.\n`,
    });
  }, 60_000);

  it('says in one sentence that the data folder cannot be made', async () => {
    const { code, stderr } = await ended(start({ DATA_DIR: '/dev/null/data' }));
    expect(code).toBe(1);
    expect(stderr).toBe(
      'The data folder /dev/null/data cannot be written (ENOTDIR): set DATA_DIR to a folder that can.\n',
    );
  }, 60_000);

  it.each([
    ['PORT', 'many', 'PORT is "many": set it to a whole number from 0 to 65535.\n'],
    ['DEMO', 'maybe', 'DEMO is "maybe": set it to on or off.\n'],
    [
      'PUBLIC_URL',
      'somewhere',
      'PUBLIC_URL is "somewhere": set it to an address such as https://air.example.org.\n',
    ],
    ['SMTP_USER', 'somebody', 'SMTP_USER, SMTP_PASS belong together: set SMTP_PASS too.\n'],
  ])(
    'says what is wrong with %s',
    async (name, value, sentence) => {
      expect(await ended(start({ [name]: value }))).toEqual({ code: 1, stderr: sentence });
    },
    60_000,
  );
});

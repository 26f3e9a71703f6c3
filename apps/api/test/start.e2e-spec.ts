import { once } from 'node:events';
import { existsSync } from 'node:fs';
import { createServer, type AddressInfo } from 'node:net';
import path from 'node:path';
import { temporaryFolder } from '../src/testing/temporary-folder';
import { startBuilt } from './built-service';

jest.setTimeout(60_000);

describe('starting the built service', () => {
  const { folder, remove } = temporaryFolder();
  afterAll(remove);
  const data = path.join(folder, 'data');

  it('says when it is ready, refuses a second start on its folder, and ends cleanly on a signal', async () => {
    const service = startBuilt(data);
    const ready = await fetch(`${await service.address}/health/ready`);
    expect(await ready.json()).toMatchObject({ status: 'ok' });
    expect(await startBuilt(data).ended).toEqual({
      code: 1,
      signal: null,
      stderr: `Lidwatch already runs on the data folder ${data}: stop it first, or set DATA_DIR to another folder.\n`,
    });
    service.kill('SIGTERM');
    expect(await service.ended).toEqual({ code: null, signal: 'SIGTERM', stderr: '' });
    expect(existsSync(path.join(data, 'lidwatch.sqlite-wal'))).toBe(false);
  });

  it('takes its folder again after it was killed', async () => {
    const service = startBuilt(data);
    await service.address;
    service.kill('SIGKILL');
    await service.ended;
    const again = startBuilt(data);
    expect((await fetch(`${await again.address}/health/ready`)).status).toBe(200);
    again.kill('SIGINT');
    expect(await again.ended).toMatchObject({ signal: 'SIGINT', stderr: '' });
  });

  it('says in one sentence that the port is in use', async () => {
    const other = createServer().listen(0);
    await once(other, 'listening');
    const { port } = other.address() as AddressInfo;
    const { code, stderr } = await startBuilt(path.join(folder, 'port'), { PORT: String(port) }).ended;
    other.close();
    expect({ code, stderr }).toEqual({
      code: 1,
      stderr: `Port ${port} is in use: stop what listens there, or set PORT to another one.\n`,
    });
  });

  it.each([
    [
      'DATA_DIR',
      '/dev/null/data',
      'The data folder /dev/null/data cannot be written (ENOTDIR): set DATA_DIR to a folder that can.\n',
    ],
    ['PORT', 'many', 'PORT is "many": set it to a whole number from 0 to 65535.\n'],
    ['DEMO', 'maybe', 'DEMO is "maybe": set it to on or off.\n'],
    [
      'PUBLIC_URL',
      'somewhere',
      'PUBLIC_URL is "somewhere": set it to an address such as https://air.example.org.\n',
    ],
    ['SMTP_USER', 'somebody', 'SMTP_USER, SMTP_PASS belong together: set SMTP_PASS too.\n'],
  ])('says in one sentence what is wrong with %s', async (name, value, stderr) => {
    expect(await startBuilt(data, { [name]: value }).ended).toEqual({ code: 1, signal: null, stderr });
  });
});

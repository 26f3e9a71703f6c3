import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import express from 'express';
import { listen, type Listening } from '../listen';
import { LiveLoggers } from './live-loggers';
import { loggerWeb } from './logger-web';
import { loggersRouter } from './loggers-router';
import { openToAll } from './web-orders';

const TEXT = 'time,t2\n05:00,-9.5\n'.repeat(500);

describe("the loggers' files over HTTP", () => {
  let folder: string;
  let server: Listening;
  beforeAll(async () => {
    folder = mkdtempSync(path.join(tmpdir(), 'logger-web-'));
    mkdirSync(path.join(folder, 'mast'));
    writeFileSync(path.join(folder, 'mast/january.csv'), TEXT);
    const [web, loggers] = [openToAll(), new LiveLoggers({ loggerDir: folder, stateFile: 'none' }, () => 0)];
    const app = express()
      .use('/control', loggersRouter(loggers, web))
      .use('/loggers', loggerWeb(folder, web));
    server = await listen(app, 0);
  });
  afterAll(async () => {
    await server.close();
    rmSync(folder, { recursive: true });
  });
  afterEach(() => order({ mode: 'ok', auth: null }));

  const get = (headers: Record<string, string> = {}, file = 'mast/january.csv') =>
    fetch(`http://127.0.0.1:${server.port}/loggers/${file}`, { headers, redirect: 'manual' });
  const order = (body: object) =>
    fetch(`http://127.0.0.1:${server.port}/control/web`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(body),
    });

  it('come whole, and not again while they are the same', async () => {
    const first = await get();
    expect(await first.text()).toBe(TEXT);
    const etag = first.headers.get('etag')!;
    const asking = { 'cache-control': 'max-age=0' };
    expect((await get({ ...asking, 'if-none-match': etag })).status).toBe(304);
    const since = first.headers.get('last-modified')!;
    expect((await get({ ...asking, 'if-modified-since': since })).status).toBe(304);
    for (const file of ['mast', 'other.csv', '..%2fsecret', 'mast/..%2f..%2fsecret'])
      expect((await get({}, file)).status).toBeGreaterThanOrEqual(400);
  });

  it.each([
    [{ username: 'mast', password: 'word' }, `Basic ${Buffer.from('mast:word').toString('base64')}`],
    [{ token: 'abc' }, 'Bearer abc'],
  ])('may ask for credentials: %j', async (auth, authorization) => {
    await order({ auth });
    const refused = await get();
    expect([refused.status, refused.headers.get('www-authenticate')]).toEqual([
      401,
      `${authorization.split(' ')[0]} realm="logger"`,
    ]);
    expect((await get({ authorization })).status).toBe(200);
  });

  it.each([
    ['error', 500],
    ['busy', 503],
    ['redirect', 302],
    ['page', 200],
  ])('may be spoiled as told, as many times: %s', async (mode, status) => {
    await order({ mode, times: 1 });
    const spoiled = await get();
    expect(spoiled.status).toBe(status);
    expect(await spoiled.text()).not.toBe(TEXT);
    expect(await (await get()).text()).toBe(TEXT);
  });

  it('may break off, or never end', async () => {
    await order({ mode: 'cut', times: 1 });
    await expect((await get()).text()).rejects.toThrow();
    await order({ mode: 'endless', times: 1 });
    let bytes = 0;
    for await (const piece of (await get()).body!) if ((bytes += piece.length) > 5 * TEXT.length) break;
    expect(bytes).toBeGreaterThan(5 * TEXT.length);
  });

  it.each([{ mode: 'odd' }, { delayMs: -1 }, { auth: { username: 'mast' } }, { colour: 'red' }])(
    'refuse the order %j',
    async (body) => expect((await order(body)).ok).toBe(false),
  );
});

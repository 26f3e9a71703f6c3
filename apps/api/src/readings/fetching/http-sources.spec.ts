import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { body, startFileServer, type Answer, type FileServer } from '../../testing/file-server';
import { signInAs, type SignedInAgent } from '../../testing/people';
import { makeTower } from '../../testing/places';
import { createTestApp, testNow, type TestApp } from '../../testing/test-app';
import type { SourceDto } from '../../towers/dto/source.dto';
import { ReadingsCollector } from '../collector/readings-collector';
import { FetchLimits } from './fetch-limits';

const PASSWORD = 'kept-to-itself';
const line = (minutesAgo: number, ...cells: (number | string)[]): string =>
  `${[new Date((testNow - minutesAgo * 60) * 1000).toISOString(), ...cells].join(',')}\n`;
const HEADER = 'time,temperature_2m,temperature_10m\n';
const FILE = HEADER + line(60, -9.5, -7.7) + line(50, -9.6, -7.6);

describe('sources over HTTP', () => {
  let test: TestApp;
  let server: FileServer;
  let other: FileServer;
  let admin: SignedInAgent;
  let analyst: SignedInAgent;
  let towerId: number;
  let id: number;

  beforeAll(async () => {
    [server, other] = [await startFileServer(), await startFileServer()];
    test = await createTestApp({
      settings: { httpSourceHosts: [server.host, 'gone.invalid', '127.0.0.1:1'] },
    });
    admin = await signInAs(test, 'administrator');
    analyst = await signInAs(test, 'analyst');
    Object.assign(test.app.get(FetchLimits), { answerMs: 300, overallMs: 600, mostBytes: 300_000 });
  }, 30_000);
  afterAll(async () => {
    await test.close();
    await Promise.all([server.close(), other.close()]);
  });
  beforeEach(async () => {
    ({ towerId } = await makeTower(test, { heightsM: [2, 10] }));
    await test.sql.run('UPDATE source SET retired_at = 1 WHERE retired_at IS NULL');
    server.requests.length = 0;
    id = (await add({ url: `${server.origin}/mast.csv` }).expect(201)).body.id as number;
  });

  const add = (source: object, by = admin) =>
    by.http.post(`/api/towers/${towerId}/sources`).send({ kind: 'http', ...source });
  const collect = async (): Promise<SourceDto> => {
    test.clock.advance(60);
    return (await analyst.http.post(`/api/sources/${id}/collect`).expect(200)).body as SourceDto;
  };
  const change = async (patch: object): Promise<SourceDto> => {
    const { body: now } = await admin.http.get(`/api/towers/${towerId}/sources`);
    const { version } = (now as SourceDto[]).find((each) => each.id === id)!;
    return (
      await admin.http
        .patch(`/api/sources/${id}`)
        .send({ version, ...patch })
        .expect(200)
    ).body as SourceDto;
  };
  const readings = async (): Promise<number> =>
    (await test.sql.get<{ n: number }>(
      'SELECT count(*) n FROM reading r JOIN sensor s ON s.id = r.sensor_id WHERE tower_id = $1',
      [towerId],
    ))!.n;

  it('are asked for what is newer than the last body, and only new lines are taken', async () => {
    const lastModified = new Date((testNow - 3000) * 1000).toUTCString();
    server.answer = body(FILE, { etag: '"one"', 'last-modified': lastModified });
    expect(await collect()).toMatchObject({ lastResult: '4 new readings.', failures: 0, collecting: false });
    server.answer = body('', {}, 304);
    expect(await collect()).toMatchObject({ lastResult: 'Not changed since the last time.', failures: 0 });
    expect(server.requests[1]!.headers).toMatchObject({
      'if-none-match': '"one"',
      'if-modified-since': lastModified,
      'cache-control': 'max-age=0',
    });
    server.answer = body(FILE + line(40, 'broken', -7.5));
    expect(await collect()).toMatchObject({ lastResult: '1 new reading, 1 row refused.', failures: 0 });
    expect(await collect()).toMatchObject({ lastResult: 'Not changed since the last time.' });
    const refused = await test.sql.all(
      'SELECT row_no, origin, name FROM refused_row r JOIN import i ON i.id = r.import_id WHERE tower_id = $1',
      [towerId],
    );
    expect(refused).toEqual([{ row_no: 4, origin: 'http', name: 'mast.csv' }]);
    expect(readdirSync(path.join(test.settings.dataDir, 'fetched'))).toEqual([]);
  });

  it('are read anew where an earlier line was corrected, or a window moved on', async () => {
    server.answer = body(FILE);
    await collect();
    server.answer = body(FILE.replace('-9.5', '-9.4') + line(40, -9.7, -7.5));
    expect(await collect()).toMatchObject({ lastResult: '2 new readings, 1 corrected, 3 known already.' });
    server.answer = body(HEADER + line(40, -9.7, -7.5) + line(30, -9.8, -7.4));
    expect(await collect()).toMatchObject({ lastResult: '2 new readings, 2 known already.' });
  });

  it('wait for a last line without its end until it came the same twice', async () => {
    server.answer = body(FILE.trimEnd(), { etag: '"half"' });
    expect(await collect()).toMatchObject({ lastResult: '2 new readings, 1 unfinished line waits.' });
    expect(await collect()).toMatchObject({ lastResult: '2 new readings.' });
    expect(server.requests[1]!.headers['if-none-match']).toBeUndefined();
    expect(await collect()).toMatchObject({ lastResult: 'Not changed since the last time.' });
    server.answer = body(FILE + line(40, -9.7, -7.5));
    expect(await collect()).toMatchObject({ lastResult: '2 new readings.' });
  });

  it('may be packed, in transfer or as a file, and of any length below the limit', async () => {
    server.answer = body(gzipSync(FILE), { 'content-encoding': 'gzip' });
    expect((await collect()).lastResult).toBe('4 new readings.');
    server.answer = body(gzipSync(FILE + line(40, -9.7, -7.5)), { 'content-type': 'application/gzip' });
    expect((await collect()).lastResult).toBe('2 new readings.');
  });

  it('give their whole lines where a packed answer was cut off, and never the half one', async () => {
    const cut = gzipSync(FILE, { level: 0 }).subarray(0, -14);
    server.answer = body(cut, { 'content-encoding': 'gzip' });
    expect((await collect()).lastResult).toBe('2 new readings, 1 unfinished line waits.');
    expect((await collect()).lastResult).toBe('Not changed since the last time.');
    expect(await readings()).toBe(2);
  });

  const slowly: Answer = (_, response) => void response.writeHead(200).write(FILE);
  const broken: Answer = (_, response) => {
    response.writeHead(200, { 'content-length': '9999' });
    response.write(FILE, () => response.destroy());
  };
  const endless: Answer = (_, response) => {
    const more = (): void =>
      void (response.destroyed || response.write(FILE.repeat(100), () => setImmediate(more)));
    more();
  };
  const bomb = gzipSync(Buffer.alloc(30_000_000, '0'));

  it.each<[string, Answer, RegExp]>([
    ['401', body('', {}, 401), /It asks for other credentials \(401\)\. Enter the right ones/],
    ['403', body('', {}, 403), /It refuses these credentials/],
    ['404', body('', {}, 404), /There is nothing at this address/],
    ['500', body('', {}, 500), /It has a fault of its own \(500\)/],
    ['204', body('', {}, 204), /It answered 204 instead of the file/],
    ['a web page', body('<!DOCTYPE html><p>Sign in</p>'), /It answers with a web page/],
    ['another table', body('when,what\n1,2\n'), /mast\.csv: The header has no column "time"/],
    ['UTF-16', body(Buffer.from('\ufefftime,t2\n', 'utf16le')), /mast\.csv: The file is UTF-16/],
    ['no answer', () => undefined, /It did not begin to answer within 0 s/],
    ['half a body and no more', slowly, /The file did not come within 1 s/],
    ['half a body and an end', broken, /The connection broke before the whole file had come/],
    ['an endless body', endless, /The file has more than 0 MB/],
    ['a long body that says so', body('x'.repeat(400_000)), /The file has more than 0 MB/],
    ['a packed bomb', body(bomb, { 'content-encoding': 'gzip' }), /The file has more than 0 MB/],
    ['a bomb in a packed file', body(bomb), /The file has more than 0 MB/],
    [
      'a packed file cut off',
      body(gzipSync(FILE).subarray(0, 60)),
      /The compressed file is damaged or cut off/,
    ],
    ['no HTTP', (request) => void request.socket.end('220 mail\r\n'), /is not HTTP/],
    ['a circle', body('', { location: '/mast.csv' }, 302), /It sends the service in a circle/],
    ['a redirect to nowhere', body('', {}, 302), /It redirects to no address/],
  ])('say what is wrong and take nothing: %s', async (_, answer, words) => {
    server.answer = answer;
    const source = await collect();
    expect(source).toMatchObject({ failures: 1, lastOkAt: null, lastResult: expect.stringMatching(words) });
    expect(source.lastResult).not.toContain('fault of the service');
    expect(await readings()).toBe(0);
    expect(readdirSync(path.join(test.settings.dataDir, 'fetched'))).toEqual([]);
  });

  it.each([
    ['http://127.0.0.1:1/mast.csv', /127\.0\.0\.1:1: It could not be asked \(bad port\)/],
    ['https://gone.invalid/mast.csv', /gone\.invalid: Its name is not known/],
  ])('say why nobody is reached: %s', async (url, words) => {
    await change({ url });
    expect((await collect()).lastResult).toMatch(words);
  });

  it('say so when nobody listens there', async () => {
    const gone = await startFileServer();
    await gone.close();
    test.settings.httpSourceHosts.push(gone.host);
    await change({ url: gone.origin });
    expect((await collect()).lastResult).toMatch(/Nothing listens there/);
  });

  it('speak of the wrong scheme', async () => {
    await change({ url: `https://${server.host}/mast.csv` });
    expect((await collect()).lastResult).toMatch(/No secure connection came about/);
  });

  it('wait as long as the other end asks for, a quarter of an hour at most', async () => {
    server.answer = body('', { 'retry-after': '700' }, 503);
    await change({ intervalSeconds: 60 });
    const { nextAt, lastAt } = await collect();
    expect((Date.parse(nextAt!) - Date.parse(lastAt!)) / 1000).toBe(700);
  });

  it('are followed within their origin, never to another', async () => {
    server.answer = (request, response) =>
      request.url === '/mast.csv'
        ? body('', { location: '/2026/mast.csv' }, 302)(request, response)
        : body(FILE)(request, response);
    expect((await collect()).lastResult).toBe('4 new readings.');
    const elsewhere = `${other.origin}/mast.csv`;
    await change({ auth: 'basic', username: 'mast', password: PASSWORD });
    server.answer = body('', { location: `${elsewhere}?key=secret` }, 301);
    const { lastResult } = await collect();
    expect(lastResult).toContain(
      `It redirects to another place, which is not followed. If that is right, enter ${elsewhere} instead`,
    );
    expect(lastResult).not.toContain('secret');
    expect(other.requests).toEqual([]);
  });

  it('send credentials, and show them nowhere', async () => {
    const basic = `Basic ${Buffer.from(`mast:${PASSWORD}`).toString('base64')}`;
    server.answer = (request, response) =>
      body(
        request.headers.authorization === basic ? FILE : '',
        {},
        request.headers.authorization === basic ? 200 : 401,
      )(request, response);
    const changed = await change({ auth: 'basic', username: 'mast', password: PASSWORD });
    expect(changed).toMatchObject({ auth: 'basic', hasSecret: true });
    const collected = await collect();
    expect(collected.lastResult).toBe('4 new readings.');
    const { body: list } = await analyst.http.get(`/api/towers/${towerId}/sources`).expect(200);
    const record = await test.sql.all('SELECT body FROM activity_body');
    const kept = await test.sql.all('SELECT * FROM source');
    for (const seen of [changed, collected, list, record, kept])
      expect(JSON.stringify(seen)).not.toMatch(PASSWORD);
    expect(JSON.stringify(record)).toContain('\\"credentials\\":\\"given\\"');
    const files = readdirSync(test.settings.dataDir, { recursive: true, withFileTypes: true });
    const texts = files
      .filter((each) => each.isFile())
      .map((each) => readFileSync(path.join(each.parentPath, each.name)));
    expect(texts.some((text) => text.includes(PASSWORD))).toBe(false);
  });

  it('keep credentials for their own place only', async () => {
    await change({ auth: 'bearer', token: 'abc.def' });
    expect(await change({ url: `${server.origin}/other.csv` })).toMatchObject({ hasSecret: true });
    server.answer = body(FILE);
    await collect();
    expect(server.requests.at(-1)!.headers.authorization).toBe('Bearer abc.def');
    const { body: refused } = await admin.http
      .patch(`/api/sources/${id}`)
      .send({ version: 3, url: 'http://127.0.0.1:1/mast.csv' })
      .expect(422);
    expect(refused).toMatchObject({
      errors: [{ field: 'token', text: expect.stringContaining('another place') }],
    });
    await test.sql.run("UPDATE source SET url = 'http://127.0.0.1:1/' WHERE id = $1", [id]);
    expect((await collect()).lastResult).toMatch(/The kept credentials cannot be opened/);
    const { body: retired } = await admin.http.post(`/api/sources/${id}/retire`).expect(200);
    expect(retired).toMatchObject({ hasSecret: false });
    expect(await test.sql.get('SELECT secret FROM source WHERE id = $1', [id])).toEqual({ secret: null });
    await analyst.http.post(`/api/sources/${id}/collect`).expect(409);
  });

  it('are collected once when they are asked for twice at once, or by their turn meanwhile', async () => {
    let end: () => void = () => undefined;
    server.answer = (request, response) => (end = () => body(FILE)(request, response));
    const both = [collect(), collect(), test.app.get(ReadingsCollector).collect('http')];
    while (server.requests.length === 0) await new Promise((resolve) => setImmediate(resolve));
    const { body: list } = await analyst.http.get(`/api/towers/${towerId}/sources`);
    expect(list).toMatchObject([{ collecting: true }]);
    end();
    await Promise.all(both);
    expect(server.requests.length).toBe(1);
    expect(await readings()).toBe(4);
  });

  it('forget what was collected by former settings', async () => {
    server.answer = body(FILE, { etag: '"one"' });
    await collect();
    await change({
      mapping: { columns: { temperature_2m: 'temperature_10m', temperature_10m: 'temperature_2m' } },
    });
    expect((await collect()).lastResult).toBe('4 corrected.');
    expect(server.requests.at(-1)!.headers['if-none-match']).toBeUndefined();
    await admin.http.patch(`/api/sources/${id}`).send({ version: 1, intervalSeconds: 600 }).expect(409);
  });

  it("are the administrator's to keep, at hosts of the list only", async () => {
    await add({ url: `${server.origin}/x.csv` }, analyst).expect(403);
    await analyst.http.patch(`/api/sources/${id}`).send({ version: 1, intervalSeconds: 600 }).expect(403);
    await analyst.http.post(`/api/sources/${id}/retire`).expect(403);
    const faults = async (source: object): Promise<unknown> => (await add(source).expect(422)).body.errors;
    expect(await faults({ url: `${other.origin}/mast.csv` })).toEqual([
      { field: 'url', text: expect.stringContaining(`add ${other.host} to HTTP_SOURCE_HOSTS`) },
    ]);
    expect(await faults({ url: 'file:///etc/passwd' })).toMatchObject([{ field: 'url' }]);
    expect(await faults({ url: `http://mast:word@${server.host}/` })).toMatchObject([{ field: 'url' }]);
    expect(await faults({ url: server.origin, intervalSeconds: 30 })).toMatchObject([
      { field: 'intervalSeconds' },
    ]);
    expect(await faults({ url: server.origin, auth: 'basic' })).toMatchObject([{ field: 'password' }]);
    expect(await faults({ url: server.origin, auth: 'bearer', username: 'x' })).toMatchObject([
      { field: 'auth' },
    ]);
    expect(await faults({ url: server.origin, path: 'mast' })).toMatchObject([{ field: 'path' }]);
    test.settings.httpSourceHosts.splice(0, 1);
    expect((await collect()).lastResult).toContain(`add ${server.host} to HTTP_SOURCE_HOSTS`);
    test.settings.httpSourceHosts.unshift(server.host);
    expect(server.requests).toEqual([]);
    expect(existsSync(path.join(test.settings.dataDir, 'fetched', `source-${id}`))).toBe(false);
  });
});

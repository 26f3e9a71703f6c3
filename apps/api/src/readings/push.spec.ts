import type { Server } from 'node:http';
import { gzipSync } from 'node:zlib';
import request from 'supertest';
import { PipelineService } from '../profiles/pipeline.service';
import { signInAs, type SignedInAgent } from '../testing/people';
import { makeTower } from '../testing/places';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';

const iso = (epochS: number): string => new Date(epochS * 1000).toISOString();
const T = testNow - 3600;

interface Counts {
  importId: number;
  new: number;
  repeated: number;
  corrected: number;
  refused: number;
}

describe('readings that a site pushes', () => {
  let test: TestApp;
  let admin: SignedInAgent;
  let analyst: SignedInAgent;
  let mast: { towerId: number; sensorIds: number[]; key: string };

  beforeAll(async () => {
    test = await createTestApp();
    admin = await signInAs(test, 'administrator');
    analyst = await signInAs(test, 'analyst');
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    const tower = await makeTower(test, { heightsM: [2, 10] });
    mast = { ...tower, key: await makeKey(tower.towerId) };
  });

  async function makeKey(towerId: number): Promise<string> {
    const { body } = await admin.http
      .post(`/api/towers/${towerId}/keys`)
      .send({ name: 'mast logger' })
      .expect(201);
    return (body as { key: string }).key;
  }

  const send = (text: string | Buffer, { key = mast.key, type = 'text/csv' } = {}) =>
    request(test.app.getHttpServer() as Server)
      .post('/api/ingest/readings')
      .set('Authorization', `Bearer ${key}`)
      .set('Content-Type', type)
      .send(text as string);
  const counts = ({ body }: { body: unknown }): Omit<Counts, 'importId'> => {
    const { new: fresh, repeated, corrected, refused } = body as Counts;
    return { new: fresh, repeated, corrected, refused };
  };
  const wide = (rows: [number, number | string, number | string][]): string =>
    [
      'time,temperature_2m,temperature_10m',
      ...rows.map(([t, ...cells]) => [iso(t), ...cells].join(',')),
    ].join('\n');

  it('are taken once, however often they are sent', async () => {
    const text = wide([[T, -9.512345678901234, -7.7]]);
    expect(counts(await send(text).expect(200))).toEqual({ new: 2, repeated: 0, corrected: 0, refused: 0 });
    expect(counts(await send(text).expect(200))).toEqual({ new: 0, repeated: 2, corrected: 0, refused: 0 });
  });

  it('replace a value by another for the same instant, and what it was is kept', async () => {
    await send(wide([[T, -9.5, -7.7]])).expect(200);
    test.clock.advance(60);
    const answer = await send(wide([[T, -9.4, -7.7]])).expect(200);
    expect(counts(answer)).toEqual({ new: 0, repeated: 1, corrected: 1, refused: 0 });
    const past = await test.sql.all('SELECT value, until_at FROM reading_past WHERE sensor_id = $1', [
      mast.sensorIds[0],
    ]);
    expect(past).toEqual([{ value: -9.5, until_at: test.clock.now() }]);
  });

  it('become a profile that says how sure it is', async () => {
    await send(wide([[T, -9.5, -7.7]])).expect(200);
    await test.app.get(PipelineService).drainAll();
    const { body } = await analyst.http.get(`/api/towers/${mast.towerId}/profile`).expect(200);
    expect(body).toMatchObject({
      tEnd: iso(T).replace('.000Z', 'Z'),
      surface: 'present',
      inversion: {
        baseM: 2,
        topM: 10,
        open: 'at the top',
        sure: true,
        strengthC: { atLeast: expect.closeTo(1.8, 9) },
      },
      layers: [
        { lowerM: 2, upperM: 10, lapseRateKPerKm: expect.closeTo(-225, 6), textbookClass: 'inversion' },
      ],
      pressureAssumed: true,
    });
    const { body: state } = await analyst.http.get(`/api/towers/${mast.towerId}/pipeline`).expect(200);
    expect(state).toEqual({ pending: 0 });
  });

  it('are worked out anew when a person sets a span aside, and again when it is undone', async () => {
    await send(wide([[T, -9.5, -7.7]])).expect(200);
    const surface = async (): Promise<string> => {
      await test.app.get(PipelineService).drainAll();
      const { body } = await analyst.http.get(`/api/towers/${mast.towerId}/profile`);
      return (body as { surface: string }).surface;
    };
    expect(await surface()).toBe('present');
    const span = {
      sensorId: mast.sensorIds[0],
      from: iso(T),
      to: iso(T),
      quality: 'failed',
      reason: 'rime on it',
    };
    await admin.http.post('/api/overrides').send(span).expect(403);
    const { body } = await analyst.http.post('/api/overrides').send(span).expect(201);
    expect(await surface()).toBe('not known');
    const { id } = body as { id: number };
    await analyst.http.delete(`/api/overrides/${id}`).expect(200);
    await analyst.http.delete(`/api/overrides/${id}`).expect(409);
    expect(await surface()).toBe('present');
    const { body: list } = await analyst.http.get(`/api/overrides?towerId=${mast.towerId}`).expect(200);
    expect(list).toMatchObject([{ reason: 'rime on it', by: analyst.name, undoneBy: analyst.name }]);
  });

  it("are never another site's", async () => {
    const other = await makeTower(test, { heightsM: [2] });
    const reading = { time: iso(T), sensor: 'temperature_30m', value: -1 };
    await test.sql.run("UPDATE sensor SET name = 'temperature_30m' WHERE tower_id = $1", [other.towerId]);
    const answer = await send(JSON.stringify({ readings: [reading] }), { type: 'application/json' }).expect(
      200,
    );
    expect(answer.body).toMatchObject({ new: 0, refused: 1, refusedRows: [{ code: 'sensor-not-known' }] });
    expect(await test.sql.all('SELECT * FROM reading WHERE sensor_id = $1', [other.sensorIds[0]])).toEqual(
      [],
    );
  });

  it('need a key that is known and not revoked', async () => {
    await send('', { key: 'site-nobody' }).expect(401);
    await request(test.app.getHttpServer() as Server)
      .post('/api/ingest/readings')
      .expect(401);
    const { body } = await admin.http.get(`/api/towers/${mast.towerId}/keys`).expect(200);
    const [key] = body as { id: number; lastUsedAt: string | null }[];
    expect(key).toMatchObject({ lastUsedAt: null, name: 'mast logger' });
    expect(JSON.stringify(body)).not.toContain(mast.key);
    await analyst.http.delete(`/api/keys/${key!.id}`).expect(403);
    await admin.http.delete(`/api/keys/${key!.id}`).expect(204);
    await send(wide([[T, -9.5, -7.7]])).expect(401);
  });

  it('are refused whole when they are too many, even packed, or of another type', async () => {
    const large = Buffer.alloc(10_500_000, 'x');
    const { body: asSent } = await send(large).expect(413);
    expect(asSent).toMatchObject({
      detail: 'The body has more than 10 MB. Send it in smaller parts, such as a week each.',
    });
    const { body: packedLarge } = await send(gzipSync(large)).set('Content-Encoding', 'gzip').expect(413);
    expect(packedLarge).toMatchObject({ detail: expect.stringContaining('more than 10 MB, unpacked') });
    await send('<readings/>', { type: 'application/xml' }).expect(415);
    const packed = gzipSync(wide([[T, -9.5, -7.7]]));
    await send(packed).set('Content-Encoding', 'gzip').expect(200);
    const { body: cut } = await send(packed.subarray(0, 20)).set('Content-Encoding', 'gzip').expect(400);
    expect(cut).toMatchObject({ detail: expect.stringContaining('damaged or cut off') });
    const { body: odd } = await send(packed).set('Content-Encoding', 'zip').expect(415);
    expect(odd).toMatchObject({ detail: expect.stringContaining('"Content-Encoding: gzip"') });
  });

  it('are counted for each key, and what is left is said', async () => {
    const text = wide([[T, -9.5, -7.7]]);
    const { headers } = await send(text).expect(200);
    expect(headers['ratelimit-policy']).toBe(
      '"requests";q=120;w=60, "bytes";q=50000000;w=60;qu="content-bytes"',
    );
    expect(headers['ratelimit']).toBe('"requests";r=119;t=60, "bytes";r=50000000;t=60');
    test.clock.advance(20);
    for (let i = 1; i < 120; i += 1) await send('', { type: 'text/csv' }).expect(422);
    const refused = await send(text).expect(429);
    expect(refused.headers).toMatchObject({
      'retry-after': '40',
      ratelimit: expect.stringMatching(/r=0;t=40/),
    });
    expect(refused.body).toMatchObject({
      code: 'too-many-requests',
      detail: expect.stringContaining('Send again in 40 s'),
    });
    const other = await makeTower(test, { heightsM: [2, 10] });
    await send(text, { key: await makeKey(other.towerId) }).expect(200);
    test.clock.advance(40);
    await send(text).expect(200);
  });

  it('are counted by their size, unpacked, too', async () => {
    const nine = gzipSync('x'.repeat(9_900_000));
    for (let i = 0; i < 6; i += 1) await send(nine).set('Content-Encoding', 'gzip').expect(422);
    const { headers, body } = await send(nine).set('Content-Encoding', 'gzip').expect(429);
    expect([headers['retry-after'], (body as { detail: string }).detail]).toEqual([
      '60',
      'This key has sent 50 MB within a minute. Send the rest in 60 s.',
    ]);
  });

  it('are not even read with a wrong key; its address is told to stop, right keys there go on', async () => {
    test.clock.advance(600);
    const wrong = () => send(Buffer.alloc(11_000_000, 'x'), { key: 'site-nobody' });
    const { headers } = await wrong().expect(401);
    expect(headers['www-authenticate']).toBe('Bearer realm="readings"');
    for (let i = 0; i < 30; i += 1) await send('', { key: `site-${i}` });
    const { headers: told } = await wrong().expect(429);
    expect(told['retry-after']).toBe('600');
    await send(wide([[T, -9.5, -7.7]])).expect(200);
    test.clock.advance(600);
    await wrong().expect(401);
  });

  it('may come a reading a line, each taken or refused alone', async () => {
    const lines = [
      JSON.stringify({ time: iso(T), sensor: 'temperature_2m', value: -9.5 }),
      '{"time": "cut o',
      '',
      JSON.stringify({ time: iso(T), sensor: 'temperature_10m', value: null }),
    ];
    const answer = await send(lines.join('\n'), { type: 'application/x-ndjson' }).expect(200);
    expect(answer.body).toMatchObject({
      new: 1,
      refused: 1,
      refusedRows: [{ row: 2, code: 'not-a-reading' }],
    });
  });

  it('leave their refused rows to be read', async () => {
    const { body } = await send(wide([[T, 'broken', -7.7]])).expect(200);
    const { importId } = body as Counts;
    const { body: page } = await analyst.http.get(`/api/imports/${importId}/refused`).expect(200);
    expect(page).toMatchObject({
      total: 1,
      items: [{ row: 2, column: 'temperature_2m', code: 'value-not-a-number', raw: `${iso(T)},broken,-7.7` }],
    });
    const { body: imports } = await analyst.http.get(`/api/imports?towerId=${mast.towerId}`).expect(200);
    expect(imports).toMatchObject({
      total: 1,
      items: [{ id: importId, origin: 'push', name: 'mast logger', new: 1, refused: 1 }],
    });
    await analyst.http.get('/api/imports/999999/refused').expect(404);
  });
});

import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { createTestApp, type TestApp } from '../testing/test-app';
import { signInAs, type SignedInAgent } from '../testing/people';

const samples = path.resolve(__dirname, '../../../../fixtures/readings');
const filesOf = (folder: string): string[] => readdirSync(path.join(samples, folder)).sort();
const typeOf = (file: string): string => (file.includes('json') ? 'application/json' : 'text/csv');

/** Bytes as they are; JSON as text, since the test's client would write bytes as a JSON object. */
const bodyOf = (file: string): string =>
  file.includes('json') ? readFileSync(file, 'utf8') : (readFileSync(file) as unknown as string);

/** How many readings of each good file are new; all hold −9.5 °C at 2 m for 05:00. */
const READINGS: Record<string, number> = {
  'any-order-and-repeats.csv': 6,
  'crlf-and-byte-order-mark.csv': 6,
  'gaps.csv': 3,
  'header-written-again.csv': 6,
  'offsets-in-the-stamps.csv': 6,
  'quoted-header-and-extra-columns.csv': 6,
  'readings.json': 2,
  'wide.csv': 6,
  'without-a-last-line-end.csv': 6,
};

interface Answer {
  new: number;
  refused: number;
  detail?: string;
  refusedRows: { row: number; column: string | null; text: string }[];
}

describe('sample files sent by a site', () => {
  let test: TestApp;
  let admin: SignedInAgent;
  let n = 0;

  beforeAll(async () => {
    test = await createTestApp();
    admin = await signInAs(test, 'administrator');
  });
  afterAll(() => test.close());

  /** Sends a file to a tower of its own, so that files do not answer for one another. */
  async function send(
    folder: string,
    file: string,
  ): Promise<{ status: number; body: Answer; towerId: number }> {
    n += 1;
    const place = { elevationM: 1150, latitude: 45, longitude: -110, intervalMinutes: 10, stamp: 'end' };
    const tower = await admin.http
      .post('/api/towers')
      .send({ name: `Mast ${n}`, ...place })
      .expect(201);
    const towerId = (tower.body as { id: number }).id;
    for (const heightM of [2, 10, 30]) {
      const sensor = { name: `t${heightM}`, quantity: 'air temperature', heightM, limits: 0.3 };
      await admin.http.post(`/api/towers/${towerId}/sensors`).send(sensor).expect(201);
    }
    const made = await admin.http.post(`/api/towers/${towerId}/keys`).send({ name: 'logger' }).expect(201);
    const { status, body } = await test.http
      .post('/api/ingest/readings')
      .set('Authorization', `Bearer ${(made.body as { key: string }).key}`)
      .set('Content-Type', typeOf(file))
      .send(bodyOf(path.join(samples, folder, file)));
    return { status, body: body as Answer, towerId };
  }

  it('knows every good file', () => {
    expect(filesOf('ok')).toEqual(Object.keys(READINGS).sort());
  });

  it.each(filesOf('ok'))('takes ok/%s whole', async (file) => {
    const { status, body, towerId } = await send('ok', file);
    expect({ status, refused: body.refused, rows: body.refusedRows }).toEqual({
      status: 200,
      refused: 0,
      rows: [],
    });
    expect(body.new).toBe(READINGS[file]);
    const first = await test.sql.get<{ value: number }>(
      `SELECT value FROM reading JOIN sensor ON sensor.id = sensor_id
       WHERE tower_id = $1 AND name = 't2' AND t_end = unixepoch('2026-01-10T05:00:00Z')`,
      [towerId],
    );
    expect(first).toEqual({ value: -9.5 });
  });

  it.each(filesOf('not-ok'))('says of not-ok/%s what is wrong and the cure', async (file) => {
    const { status, body } = await send('not-ok', file);
    expect([200, 422]).toContain(status);
    if (status === 422) {
      expect(body.detail).toMatch(/\b(send|save|export|name|use|give|unpack)\b.*\./i);
      return;
    }
    expect(body.refused).toBeGreaterThan(0);
    for (const { row, text } of body.refusedRows) {
      expect(row).toBeGreaterThan(0);
      expect(text).toMatch(new RegExp(`^Row ${row}(, column "[^"]+")?: .+;.+\\.$`));
    }
  });
});

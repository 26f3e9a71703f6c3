import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { signInAs, type SignedInAgent } from '../testing/people';
import { makeTower } from '../testing/places';
import { createTestApp, type TestApp } from '../testing/test-app';
import { ImportRunner } from './importing/import-runner';
import { mutate } from './parse/fuzz/mutate';
import { DEFAULT_MAPPING } from './parse/mapping';
import { ReadingContexts } from './reading-contexts';
import { UploadRuns } from './uploads/upload-runs.service';

jest.setTimeout(60_000);

const FOLDER = path.resolve(__dirname, '../../../../fixtures/readings/not-ok');
const FILES = readdirSync(FOLDER).filter((file) => !file.includes('json'));
const GOOD = [
  'time,t2,t10,t30',
  ...[0, 1, 2, 3].map((i) => `2026-01-10T05:${i}0:00Z,-9.${i},-7.${i},-5.${i}`),
].join('\n');
const SENTENCE = /^\p{Lu}[^]{15,}\.$/u;

/** Files too large or too dull to keep: made here. */
const MADE: Record<string, () => Buffer> = {
  'a hundred thousand columns': () => Buffer.from(`time,${'c,'.repeat(100_000)}t2\n`),
  'two hundred thousand blank lines': () => Buffer.from('\n'.repeat(200_000)),
  'one line of eight megabytes': () => Buffer.alloc(8_000_000, 'x'),
  'a gzip that unpacks to a hundred megabytes': () => gzipSync(Buffer.alloc(100_000_000)),
  'nothing but quotation marks': () => Buffer.alloc(100_000, '"'),
  nothing: () => Buffer.alloc(0),
  'a zip with nothing in it': () => Buffer.from([0x50, 0x4b, 5, 6, ...Array<number>(18).fill(0)]),
};

describe('hostile files', () => {
  let test: TestApp;
  let admin: SignedInAgent;
  let towerId: number;
  let key: string;

  beforeAll(async () => {
    test = await createTestApp();
    admin = await signInAs(test, 'administrator');
    ({ towerId } = await makeTower(test, { heightsM: [] }));
    for (const heightM of [2, 10, 30])
      await admin.http
        .post(`/api/towers/${towerId}/sensors`)
        .send({ name: `t${heightM}`, quantity: 'air temperature', heightM, limits: 0.3 })
        .expect(201);
    const made = await admin.http.post(`/api/towers/${towerId}/keys`).send({ name: 'logger' }).expect(201);
    ({ key } = made.body as { key: string });
  });
  afterAll(() => test.close());

  /** Brings a file as a person does, as far as it goes; every answer, with what it says. */
  async function bring(bytes: Buffer, name: string): Promise<{ status: number; detail?: string }[]> {
    const answers: { status: number; detail?: string }[] = [];
    const keep = <T extends { status: number; body: unknown }>(answer: T): T => {
      const { detail } = answer.body as { detail?: string };
      answers.push({ status: answer.status, ...(answer.status >= 400 && { detail }) });
      return answer;
    };
    const sent = keep(
      await admin.http
        .post(`/api/uploads?towerId=${towerId}&name=${encodeURIComponent(name)}`)
        .set('Content-Type', 'application/octet-stream')
        .send(bytes as unknown as string),
    );
    if (sent.status !== 201) return answers;
    const at = `/api/uploads/${(sent.body as { id: number }).id}`;
    const proposed = keep(await admin.http.get(`${at}/proposal`));
    if (proposed.status !== 200) return answers;
    const { mapping } = proposed.body as { mapping: object };
    keep(await admin.http.post(`${at}/preview`).send({ mapping }));
    keep(await admin.http.post(`${at}/commit`).send({ mapping }));
    await test.app.get(UploadRuns).idle();
    return answers;
  }
  const faulty = (answers: { status: number; detail?: string }[]) =>
    answers.filter(({ status, detail }) => status >= 500 || (status >= 400 && !SENTENCE.test(detail ?? '')));

  it.each(FILES)('brought by a person: %s is answered in a sentence', async (file) => {
    expect(faulty(await bring(readFileSync(path.join(FOLDER, file)), file))).toEqual([]);
  });

  it.each(Object.keys(MADE))('brought by a person: %s is answered in a sentence', async (name) => {
    expect(faulty(await bring(MADE[name]!(), 'file.csv'))).toEqual([]);
    expect(faulty(await bring(MADE[name]!(), 'file.xlsx'))).toEqual([]);
  });

  const push = (body: string, type = 'text/csv') =>
    test.http
      .post('/api/ingest/readings')
      .set({ Authorization: `Bearer ${key}`, 'Content-Type': type })
      .send(body);

  it('two hundred mutated pushes never break the service', async () => {
    for (let seed = 1; seed <= 200; seed++) {
      const { status, body } = await push(mutate(GOOD, seed));
      const { detail, refusedRows = [] } = body as { detail?: string; refusedRows?: { text: string }[] };
      const isSaid =
        status === 200 ? refusedRows.every(({ text }) => SENTENCE.test(text)) : SENTENCE.test(detail ?? '');
      expect({ seed, status: status < 500, isSaid, detail }).toEqual({
        seed,
        status: true,
        isSaid: true,
        detail,
      });
    }
  });

  it('a line of a gigabyte is refused alone, in little memory', async () => {
    const context = await test.app.get(ReadingContexts, { strict: false }).of(towerId, DEFAULT_MAPPING);
    const piece = Buffer.alloc(4_000_000, '7');
    async function* bytes(): AsyncGenerator<Buffer> {
      yield Buffer.from('time,t2,t10,t30\n');
      for (let i = 0; i < 250; i++) yield piece;
      yield Buffer.from('\n2026-01-11T05:00:00Z,-9.5,-7.7,-5.6\n');
    }
    const before = process.memoryUsage().rss;
    const taken = await test.app
      .get(ImportRunner, { strict: false })
      .run({ towerId, context, bytes: bytes(), origin: { origin: 'upload', name: 'line.csv' } });
    expect(taken).toMatchObject({ new: 3, refused: 1 });
    expect(process.memoryUsage().rss - before).toBeLessThan(200_000_000);
  });

  it('leave nothing in the store that is no measurement', async () => {
    const rows = await test.sql.all<{ value: number }>('SELECT DISTINCT value FROM reading');
    expect(rows.every(({ value }) => Number.isFinite(value) && Math.abs(value) < 1e300)).toBe(true);
  });
});

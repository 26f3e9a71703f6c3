import { DirtyStages } from '../../database/dirty';
import { makeTower } from '../../testing/places';
import { createTestApp, testNow, type TestApp } from '../../testing/test-app';
import { DEFAULT_MAPPING } from '../parse/mapping';
import { ReadingContexts } from '../reading-contexts';
import { ImportRunner, type ImportJob, type Imported } from './import-runner';

const BEGIN = testNow - 40 * 86_400;
const iso = (t: number): string => new Date(t * 1000).toISOString();

jest.setTimeout(20_000);

describe('the import of a whole file', () => {
  let test: TestApp;
  let mast: { towerId: number; sensorIds: number[] };
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    mast = await makeTower(test, { interval_s: 600, block_s: 600 });
  });

  const line = (i: number, value: number | string): string =>
    `${iso(BEGIN + i * 600)},${value},${-5 + (i % 7)}`;
  const HEADER = 'time,temperature_2m,temperature_10m,battery';
  const fileOf = (lines: number): string =>
    [HEADER, ...Array.from({ length: lines }, (_, i) => `${line(i, -6 + (i % 5))},12.6`)].join('\n');

  async function* pieces(text: string, size = 10_000): AsyncGenerator<Buffer> {
    const bytes = Buffer.from(text);
    for (let at = 0; at < bytes.length; at += size) yield bytes.subarray(at, at + size);
  }

  async function run(text: string, more: Partial<ImportJob> = {}): Promise<Imported> {
    const context = await test.app.get(ReadingContexts, { strict: false }).of(mast.towerId, DEFAULT_MAPPING);
    return test.app.get(ImportRunner, { strict: false }).run({
      ...{ towerId: mast.towerId, context, bytes: pieces(text), pieceBytes: 20_000 },
      origin: { origin: 'upload', name: 'mast.csv', sha256: 'ab'.repeat(32) },
      ...more,
    });
  }
  const rowOf = (importId: number): Promise<object | undefined> =>
    test.sql.get('SELECT state, new_count fresh, refused_count refused, sha256 FROM import WHERE id = $1', [
      importId,
    ]);

  it('is one import with its counts, spans and state, in many transactions', async () => {
    const done: number[] = [];
    const text = fileOf(1_500);
    const imported = await run(text, { onProgress: (bytes) => done.push(bytes) });
    expect(imported).toMatchObject({ new: 3_000, repeated: 0, corrected: 0, refused: 0, cancelled: false });
    expect(imported.ignoredColumns).toEqual(['battery']);
    expect(done.at(-1)).toBe(text.length);
    expect(done.length).toBeGreaterThan(1);
    expect(await rowOf(imported.importId)).toEqual({
      ...{ state: 'done', fresh: 3_000, refused: 0, sha256: 'ab'.repeat(32) },
    });
    expect(
      await test.sql.all('SELECT sensor_id, t0, t1 FROM import_span WHERE import_id = $1', [
        imported.importId,
      ]),
    ).toEqual(
      mast.sensorIds.slice(0, 2).map((sensor_id) => ({ sensor_id, t0: BEGIN, t1: BEGIN + 1_499 * 600 })),
    );
  });

  it('changes nothing the second time', async () => {
    const text = fileOf(1_500);
    await run(text);
    await test.app.get(DirtyStages).drainAll();
    expect(await run(text)).toMatchObject({ new: 0, repeated: 3_000, corrected: 0 });
    expect(await test.sql.get('SELECT count(*) n FROM dirty WHERE subject = $1', [mast.towerId])).toEqual({
      n: 0,
    });
  });

  it('refuses rows by their number in the file, wherever the pieces end', async () => {
    const lines = fileOf(2_000).split('\n');
    lines[1_234] = `${line(1_233, 'warm')},12.6`;
    const imported = await run(lines.join('\r\n'), { bytes: pieces(lines.join('\r\n'), 777) });
    expect(imported).toMatchObject({ new: 3_999, refused: 1 });
    expect(
      await test.sql.all('SELECT row_no, col FROM refused_row WHERE import_id = $1', [imported.importId]),
    ).toEqual([{ row_no: 1_235, col: 'temperature_2m' }]);
  });

  it('keeps what was taken when it is cancelled', async () => {
    let asked = 0;
    const imported = await run(fileOf(2_000), { isCancelled: () => (asked += 1) > 3 });
    expect(imported.cancelled).toBe(true);
    expect(imported.new).toBeGreaterThan(0);
    expect(imported.new).toBeLessThan(4_000);
    expect(await rowOf(imported.importId)).toMatchObject({ state: 'cancelled', fresh: imported.new });
  });

  it('leaves nothing where the header cannot be used, and says failed where it broke off', async () => {
    await expect(run('when,t2\n1,2\n')).rejects.toThrow('no column "time"');
    const count = 'SELECT count(*) n FROM import WHERE tower_id = $1';
    expect(await test.sql.get(count, [mast.towerId])).toEqual({ n: 0 });
    async function* broken(): AsyncGenerator<Buffer> {
      yield* pieces(fileOf(2_000));
      throw new Error('the disk is gone');
    }
    await expect(run('', { bytes: broken() })).rejects.toThrow('the disk is gone');
    expect(
      await test.sql.get('SELECT state, new_count > 0 some FROM import WHERE tower_id = $1', [mast.towerId]),
    ).toEqual({ state: 'failed', some: 1 });
  });

  it('counts every refused row and keeps the first 100,000, and says so', async () => {
    const lines = [HEADER, ...Array.from({ length: 100_003 }, () => 'x,1,2,3')];
    const imported = await run(lines.join('\n'), { bytes: pieces(lines.join('\n'), 100_000) });
    expect(imported).toMatchObject({ new: 0, refused: 100_003 });
    const kept = await test.sql.all<{ row_no: number; code: string; text: string }>(
      'SELECT row_no, code, text FROM refused_row WHERE import_id = $1 ORDER BY row_no DESC LIMIT 2',
      [imported.importId],
    );
    expect(kept[0]).toMatchObject({ row_no: 100_002, code: 'further-rows-not-kept' });
    expect(kept[0]!.text).toContain('counted but not kept');
    expect(kept[1]).toMatchObject({ row_no: 100_001, code: 'time-not-readable' });
  });
});

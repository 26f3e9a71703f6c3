import { PipelineService } from '../profiles/pipeline.service';
import { signInAs, type SignedInAgent } from '../testing/people';
import { makeTower } from '../testing/places';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';
import type { ImportDto } from './dto/import.dto';
import { ReadingsService } from './readings.service';
import { refusedRow } from './refusal';

const STEP_S = 600;
const T = testNow - 12 * STEP_S;

describe('an import that is taken back', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  let mast: { towerId: number; sensorIds: number[] };

  beforeAll(async () => {
    test = await createTestApp();
    analyst = await signInAs(test, 'analyst');
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    mast = await makeTower(test, { heightsM: [2, 10] });
  });

  /** Imports value for both levels at steps i … j−1, and gives the import's id. */
  const take = async (value: number, from: number, to: number): Promise<number> => {
    test.clock.advance(1);
    const rows = mast.sensorIds.flatMap((sensorId, level) =>
      Array.from({ length: to - from }, (_, i) => ({
        ...{ sensorId, tEnd: T + (from + i) * STEP_S, value: value + level },
        rowNo: i + 2,
      })),
    );
    const origin = { origin: 'upload' as const, name: `${value}.csv` };
    return (await test.app.get(ReadingsService).ingest(mast.towerId, rows, origin)).importId;
  };
  const inForce = async (): Promise<(number | null)[]> => {
    const rows = await test.sql.all<{ t: number; value: number }>(
      'SELECT t_end t, value FROM reading WHERE sensor_id = $1',
      [mast.sensorIds[0]],
    );
    const known = new Map(rows.map(({ t, value }) => [t, value]));
    return [0, 1, 2, 3, 4].map((i) => known.get(T + i * STEP_S) ?? null);
  };
  const withdraw = (id: number, status = 200) =>
    analyst.http.post(`/api/imports/${id}/withdraw`).send({ reason: 'wrong logger' }).expect(status);

  it('gives way to what was in force before, and to nothing where nothing was', async () => {
    await take(1, 0, 3);
    const second = await take(2, 1, 5);
    expect(await inForce()).toEqual([1, 2, 2, 2, 2]);
    const { body } = await withdraw(second);
    expect(body as ImportDto).toMatchObject({
      state: 'withdrawn',
      canWithdraw: false,
      withdrawnBy: analyst.name,
    });
    expect(await inForce()).toEqual([1, 1, 1, null, null]);
  });

  it.each([
    ['the older first', [0, 1]],
    ['the newer first', [1, 0]],
  ])('leaves the third standing when two of three are taken back, %s', async (_, order) => {
    await take(1, 0, 3);
    const two = [await take(2, 0, 4), await take(3, 1, 5)];
    expect(await inForce()).toEqual([2, 3, 3, 3, 3]);
    for (const which of order) await withdraw(two[which]!);
    expect(await inForce()).toEqual([1, 1, 1, null, null]);
  });

  it('keeps what it brought on the record, and can be imported again', async () => {
    const first = await take(1, 0, 2);
    await withdraw(first);
    const kept = await test.sql.all('SELECT value FROM reading_past WHERE sensor_id = $1', [
      mast.sensorIds[0],
    ]);
    expect(kept).toEqual([{ value: 1 }, { value: 1 }]);
    await take(1, 0, 2);
    expect(await inForce()).toEqual([1, 1, null, null, null]);
  });

  it('takes its findings along: what they rest on is no longer there', async () => {
    await take(-5, 0, 3);
    const second = await take(-9, 3, 5);
    await test.app.get(PipelineService).drainAll();
    const found = () =>
      test.sql.all<{ surface: string }>('SELECT surface FROM profile WHERE tower_id = $1 ORDER BY t_end', [
        mast.towerId,
      ]);
    expect((await found()).map(({ surface }) => surface)).toEqual(Array(5).fill('present'));
    await withdraw(second);
    await test.app.get(PipelineService).drainAll();
    expect((await found()).map(({ surface }) => surface)).toEqual([
      ...Array<string>(3).fill('present'),
      ...Array<string>(2).fill('not known'),
    ]);
  });

  it('is taken back once, and says so', async () => {
    const id = await take(1, 0, 2);
    await withdraw(id);
    const { body } = await withdraw(id, 409);
    expect((body as { detail: string }).detail).toMatch(new RegExp(`^Already undone by ${analyst.name}`));
    await withdraw(99_999, 404);
  });

  it('is finished by the next process where one died in the middle', async () => {
    const id = await take(1, 0, 2);
    await test.sql.run('UPDATE import SET withdrawn_at = $2 WHERE id = $1', [id, test.clock.now()]);
    const next = await createTestApp({ dataDir: test.settings.dataDir, clock: test.clock }).catch(
      () => undefined,
    );
    expect(next).toBeUndefined();
    await test.app.close();
    test = await createTestApp({ dataDir: test.settings.dataDir, clock: test.clock });
    analyst = await signInAs(test, 'analyst');
    expect(await inForce()).toEqual([null, null, null, null, null]);
  });

  it('gives its refused rows as a table in which no cell is a formula', async () => {
    const refused = [
      refusedRow(
        4,
        't2',
        { code: 'value-not-a-number', why: 'it says "no".' },
        '=HYPERLINK("http://example.org"),1',
      ),
    ];
    const origin = { origin: 'upload' as const, name: 'a.csv', refused };
    const { importId } = await test.app.get(ReadingsService).ingest(mast.towerId, [], origin);
    const { text, headers } = await analyst.http.get(`/api/imports/${importId}/refused.csv`).expect(200);
    expect(headers['content-disposition']).toMatch(/attachment/);
    expect(text.replace('\ufeff', '').split('\n')).toEqual([
      'row,column,code,reason,line',
      `4,t2,value-not-a-number,"Row 4, column ""t2"": it says ""no"".","'=HYPERLINK(""http://example.org""),1"`,
      '',
    ]);
  });
});

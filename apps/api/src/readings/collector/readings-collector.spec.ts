import { appendFileSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { SourcesService } from '../../towers/sources.service';
import { signInAs } from '../../testing/people';
import { makeTower } from '../../testing/places';
import { createTestApp, testNow, type TestApp } from '../../testing/test-app';
import { ReadingsService } from '../readings.service';
import { ReadingsCollector } from './readings-collector';

const line = (minutesAgo: number, ...cells: (number | string)[]): string =>
  [new Date((testNow - minutesAgo * 60) * 1000).toISOString(), ...cells].join(',');
const HEADER = 'time,temperature_2m,temperature_10m\n';

describe("the collector of loggers' files", () => {
  let test: TestApp;
  let loggerDir: string;
  let towerId: number;
  let folder: string;

  beforeAll(async () => {
    loggerDir = mkdtempSync(path.join(tmpdir(), 'lidwatch-loggers-'));
    test = await createTestApp({ settings: { loggerDir } });
  });
  afterAll(async () => {
    await test.close();
    rmSync(loggerDir, { recursive: true });
  });
  beforeEach(async () => {
    ({ towerId } = await makeTower(test, { heightsM: [2, 10] }));
    folder = path.join(loggerDir, `mast-${towerId}`);
    mkdirSync(folder);
    const admin = await signInAs(test, 'administrator');
    const source = { kind: 'folder', path: `mast-${towerId}`, mapping: { missing: ['NaN'] } };
    await admin.http.post(`/api/towers/${towerId}/sources`).send(source).expect(201);
  });

  const collect = async (): Promise<void> => {
    test.clock.advance(60);
    await test.app.get(ReadingsCollector).collect();
  };
  const readings = () =>
    test.sql.all(
      'SELECT value FROM reading r JOIN sensor s ON s.id = r.sensor_id WHERE tower_id = $1 ORDER BY value',
      [towerId],
    );
  const waitS = ({ nextAt, lastAt }: { nextAt: string | null; lastAt: string | null }): number =>
    (Date.parse(nextAt!) - Date.parse(lastAt!)) / 1000;
  const source = async () => (await test.app.get(SourcesService).list(towerId))[0]!;

  it('reads on where it was, leaves half lines, and takes nothing twice', async () => {
    const file = path.join(folder, 'january.csv');
    writeFileSync(file, `${HEADER}${line(60, -9.5, -7.7)}\n${line(50, -9.6, 'NaN')}\n${line(40, -9.7)}`);
    await collect();
    expect(await readings()).toEqual([{ value: -9.6 }, { value: -9.5 }, { value: -7.7 }]);
    expect((await source()).lastResult).toBe('3 new readings, 1 unfinished line waits.');
    appendFileSync(file, ',-7.9\n');
    await collect();
    await collect();
    expect((await readings()).length).toBe(5);
    const imports = await test.sql.all(
      'SELECT origin, name, new_count, refused_count FROM import WHERE tower_id = $1',
      [towerId],
    );
    expect(imports).toEqual([
      { origin: 'folder', name: 'january.csv', new_count: 3, refused_count: 0 },
      { origin: 'folder', name: 'january.csv', new_count: 2, refused_count: 0 },
    ]);
  });

  it('reads a file that was replaced anew, without taking readings twice', async () => {
    const file = path.join(folder, 'mast.csv');
    writeFileSync(file, `${HEADER}${line(60, -9.5, -7.7)}\n${line(50, -9.6, -7.8)}\n`);
    await collect();
    writeFileSync(file, `${HEADER}${line(60, -9.5, -7.7)}\n`);
    await collect();
    expect((await readings()).length).toBe(4);
    appendFileSync(file, `${line(30, 'broken', -7.6)}\n`);
    await collect();
    const refused = await test.sql.all(
      'SELECT row_no, col, code FROM refused_row r JOIN import i ON i.id = r.import_id WHERE tower_id = $1',
      [towerId],
    );
    expect(refused).toEqual([{ row_no: 3, col: 'temperature_2m', code: 'value-not-a-number' }]);
  });

  it('looks for a folder that is not there yet every minute, and says so', async () => {
    rmSync(folder, { recursive: true });
    for (let minutes = 1; minutes <= 3; minutes += 1) {
      await collect();
      const now = await source();
      expect(now.lastResult).toMatch(/is not there\. Look whether the logger's folder is connected/);
      expect([now.failures, waitS(now)]).toEqual([minutes, 60]);
    }
    mkdirSync(folder);
    await collect();
    expect(await source()).toMatchObject({ failures: 0, lastResult: 'No file of readings is there yet.' });
  });

  it('waits longer each time a file cannot be used, a quarter of an hour at most', async () => {
    writeFileSync(path.join(folder, 'a.csv'), 'when,what\n1,2\n');
    const waits: number[] = [];
    for (let i = 0; i < 6; i += 1) {
      await collect();
      waits.push(waitS(await source()));
      test.clock.advance(waits.at(-1)! - 60);
    }
    expect(waits).toEqual([120, 240, 480, 900, 900, 900]);
    const { failingSince, lastOkAt, lastAt } = await source();
    expect([lastOkAt, (Date.parse(lastAt!) - Date.parse(failingSince!)) / 1000]).toEqual([null, 2640]);
    writeFileSync(path.join(folder, 'a.csv'), `${HEADER}${line(60, -9.5, -7.7)}\n`);
    test.clock.advance(840);
    await collect();
    expect(await source()).toMatchObject({ failures: 0, failingSince: null, lastResult: '2 new readings.' });
  });

  it('counts the wait from the begin of a collection, so that a slow one misses no turn', async () => {
    const service = test.app.get(ReadingsService, { strict: false });
    const ingest = service.ingest.bind(service);
    const slow = jest.spyOn(service, 'ingest').mockImplementation((...given) => {
      test.clock.advance(3);
      return ingest(...given);
    });
    writeFileSync(path.join(folder, 'mast.csv'), `${HEADER}${line(60, -9.5, -7.7)}\n`);
    const begunAt = test.clock.now() + 60;
    await collect();
    slow.mockRestore();
    expect(Date.parse((await source()).nextAt!) / 1000).toBe(begunAt + 60);
  });

  it('takes a large file in as one import, then what follows in it', async () => {
    const file = path.join(folder, 'years.csv');
    const note = 'calm '.repeat(1000);
    const lines = Array.from({ length: 300 }, (_, i) => line(4000 - 10 * i, -9 - i / 100, -7.123, note));
    writeFileSync(file, `${HEADER.trim()},note\n${lines.join('\n')}\n${line(30, -9)}`);
    await collect();
    expect((await source()).lastResult).toBe(
      '600 new readings, 1 unfinished line waits. No sensor has the column "note".',
    );
    appendFileSync(file, `,-7,\n${line(20, 'broken', -7.5, '')}\n`);
    await collect();
    expect((await source()).lastResult).toBe(
      '3 new readings, 1 row refused. No sensor has the column "note".',
    );
    const imports = await test.sql.all(
      `SELECT i.name, i.new_count newCount, r.row_no rowNo FROM import i LEFT JOIN refused_row r ON r.import_id = i.id
       WHERE tower_id = $1 ORDER BY i.id`,
      [towerId],
    );
    expect(imports).toEqual([
      { name: 'years.csv', newCount: 600, rowNo: null },
      { name: 'years.csv', newCount: 3, rowNo: 303 },
    ]);
  });

  it('refuses a line that is no text alone, in a file that goes on', async () => {
    const file = path.join(folder, 'mast.csv');
    writeFileSync(file, `\ufeff${HEADER}${line(60, -9.5, -7.7)}\n`);
    await collect();
    appendFileSync(
      file,
      Buffer.concat([Buffer.of(0xff, 0xfe, 0x0a), Buffer.from(`${line(50, -9.6, -7.6)}\n`)]),
    );
    await collect();
    expect((await source()).lastResult).toBe('2 new readings, 1 row refused.');
    const refused = await test.sql.all(
      'SELECT row_no, code FROM refused_row r JOIN import i ON i.id = r.import_id WHERE tower_id = $1',
      [towerId],
    );
    expect(refused).toEqual([{ row_no: 3, code: 'line-not-text' }]);
  });

  it('goes on with the other files when one cannot be read', async () => {
    writeFileSync(path.join(folder, 'a.csv'), 'when,what\n1,2\n');
    writeFileSync(path.join(folder, 'b.csv'), `${HEADER}${line(60, -9.5, -7.7)}\n`);
    await collect();
    expect((await readings()).length).toBe(2);
    expect((await source()).lastResult).toMatch(/^a\.csv: The header has no column "time"/);
  });
});

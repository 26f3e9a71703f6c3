import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import type { ComputePool as Pool } from '../src/compute/compute-pool';
import { makeUser, testPassword } from '../src/testing/people';
import { makeTower } from '../src/testing/places';
import { temporaryFolder } from '../src/testing/temporary-folder';
import { createTestApp } from '../src/testing/test-app';
import { startBuilt, type BuiltService } from './built-service';
import { until } from './local-services';

jest.setTimeout(120_000);

const BEGIN = Date.UTC(2024, 0, 1) / 1000;
const NAMES = ['temperature_2m', 'temperature_10m', 'temperature_30m', 'temperature_60m'];

/** A line every ten minutes for so many readings. */
const fileOf = (readings: number): string =>
  [
    ['time', ...NAMES].join(','),
    ...Array.from({ length: readings / NAMES.length }, (_, i) => {
      const night = Math.cos((i / 144) * 2 * Math.PI);
      const cells = NAMES.map((_, k) => (-4 + night * (k - 2) + Math.sin(i * (k + 1)) * 0.3).toFixed(2));
      return `${new Date((BEGIN + (i + 1) * 600) * 1000).toISOString()},${cells.join(',')}`;
    }),
  ].join('\n');

interface Upload {
  id: number;
  state: string;
  importId: number | null;
  fault: string | null;
  bytesDone: number;
}

describe('a large file that the built service imports', () => {
  const data = temporaryFolder();
  const masts: number[] = [];
  let email = '';
  let service: BuiltService;
  let address = '';
  let cookie = '';
  afterAll(() => data.remove());

  const send = async <T>(method: string, route: string, body?: string | object): Promise<T> => {
    const type = typeof body === 'string' ? 'application/octet-stream' : 'application/json';
    const answer = await fetch(`${address}${route}`, {
      ...{ method, body: typeof body === 'object' ? JSON.stringify(body) : (body ?? null) },
      headers: { origin: address, cookie, ...(body === undefined ? {} : { 'content-type': type }) },
    });
    const [set] = answer.headers.getSetCookie();
    if (set) cookie = set.split(';')[0]!;
    const text = await answer.text();
    if (!answer.ok) throw new Error(`${method} ${route}: ${answer.status} ${text}`);
    return JSON.parse(text) as T;
  };
  const start = async (): Promise<void> => {
    service = startBuilt(data.folder);
    address = await service.address;
    await send('POST', '/api/auth/sign-in', { email, password: testPassword });
  };
  const begin = async (towerId: number, readings: number): Promise<Upload> => {
    const { id } = await send<Upload>(
      'POST',
      `/api/uploads?towerId=${towerId}&name=mast.csv`,
      fileOf(readings),
    );
    return send('POST', `/api/uploads/${id}/commit`, { mapping: { timeColumn: 'time' } });
  };
  const uploadOf = (id: number): Promise<Upload> => send('GET', `/api/uploads/${id}`);
  const pendingOf = async (towerId: number): Promise<number> =>
    (await send<{ pending: number }>('GET', `/api/towers/${towerId}/pipeline`)).pending;

  /** Processor time, in ticks, of each thread of the service that gives way to others (Linux: field 19, nice). */
  const ticksOfNicedThreads = (): number[] => {
    const tasks = `/proc/${service.pid}/task`;
    return readdirSync(tasks)
      .map((id) =>
        readFileSync(path.join(tasks, id, 'stat'), 'utf8')
          .replace(/^.*\) /, '')
          .split(' '),
      )
      .filter((fields) => Number(fields[16]) > 0)
      .map((fields) => Number(fields[11]) + Number(fields[12]));
  };

  beforeAll(async () => {
    const test = await createTestApp({ dataDir: data.folder });
    email = (await makeUser(test, 'analyst')).email;
    for (let i = 0; i < 2; i += 1) masts.push((await makeTower(test)).towerId);
    await test.close();
  });

  it('is worked out in a thread that gives way, and all of it arrives', async () => {
    await start();
    if (existsSync('/proc/self/task')) expect(ticksOfNicedThreads()).toEqual([]);
    const { id } = await begin(masts[0]!, 20_000);
    const { importId } = await until(
      () => uploadOf(id),
      ({ state }) => state !== 'running',
      60_000,
    );
    expect(await send('GET', `/api/imports/${importId}`)).toMatchObject({ new: 20_000, refused: 0 });
    await until(
      () => pendingOf(masts[0]!),
      (pending) => pending === 0,
      60_000,
    );
    if (existsSync('/proc/self/task')) {
      const ticks = ticksOfNicedThreads();
      expect(ticks).toHaveLength(1);
      expect(ticks[0]).toBeGreaterThan(5);
    }
  });

  it('stops with the service, loses nothing, and goes on when it is imported again', async () => {
    const { id } = await begin(masts[1]!, 100_000);
    await until(
      () => uploadOf(id),
      ({ bytesDone }) => bytesDone > 0,
      30_000,
    );
    const asked = Date.now();
    service.kill('SIGINT');
    expect(await service.ended).toMatchObject({ signal: 'SIGINT', stderr: '' });
    expect(Date.now() - asked).toBeLessThan(8_000);
    await start();
    expect((await uploadOf(id)).state).toMatch(/cancelled|failed/);
    await until(
      () => pendingOf(masts[1]!),
      (pending) => pending === 0,
      60_000,
    );
    const { id: again } = await begin(masts[1]!, 100_000);
    const ended = await until(
      () => uploadOf(again),
      ({ state }) => state !== 'running',
      60_000,
    );
    const counts = await send<{ new: number; repeated: number }>('GET', `/api/imports/${ended.importId}`);
    expect(counts.new + counts.repeated).toBe(100_000);
    expect(counts.repeated).toBeGreaterThan(0);
    service.kill('SIGTERM');
    await service.ended;
  });
});

describe('the compute thread', () => {
  const { folder, remove } = temporaryFolder();
  afterAll(remove);

  it('that ends in the middle fails its task with a cure, and the next task gets a new one', async () => {
    const file = path.join(folder, 'tasks.js');
    writeFileSync(file, 'exports.die = () => process.exit(3);\nexports.twice = (n) => 2 * n;\n');
    const built = path.resolve(__dirname, '../dist/compute/compute-pool.js');
    const { ComputePool } = (await import(built)) as { ComputePool: typeof Pool };
    const pool = new ComputePool();
    const die = { file, name: 'die', work: () => 0 };
    await expect(pool.run(die, undefined)).rejects.toThrow('What waits stays marked');
    expect(await pool.run({ file, name: 'twice', work: (n: number) => n }, 21)).toBe(42);
    await pool.onApplicationShutdown();
  });
});

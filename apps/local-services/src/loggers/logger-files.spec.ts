import { appendFile, mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { LiveLoggers } from './live-loggers';
import type { LoggerFolders } from './logger-files';

const FIRST_START = Date.UTC(2026, 11, 1, 5) / 1000;
const DAY_S = 86_400;
const made: string[] = [];

async function folders(): Promise<LoggerFolders> {
  const dir = await mkdtemp(path.join(os.tmpdir(), 'loggers-'));
  made.push(dir);
  return { loggerDir: path.join(dir, 'loggers'), stateFile: path.join(dir, 'loggers.json') };
}

/** Every file under the loggers' folder by its name. */
async function contents({ loggerDir }: LoggerFolders): Promise<Record<string, string>> {
  const names = (await readdir(loggerDir, { recursive: true })).filter((name) => name.endsWith('.csv'));
  return Object.fromEntries(
    await Promise.all(
      names.sort().map(async (name) => [name, await readFile(path.join(loggerDir, name), 'utf8')]),
    ),
  );
}

async function begun(at: LoggerFolders, from: number): Promise<LiveLoggers> {
  const loggers = new LiveLoggers(at, () => FIRST_START);
  await loggers.begin(FIRST_START, false);
  await loggers.skip(from);
  return loggers;
}

afterAll(() => Promise.all(made.map((dir) => rm(dir, { recursive: true }))));

it('writes the same files in one piece, in pieces of any size, and after being stopped and opened again', async () => {
  const from = FIRST_START - 3 * DAY_S;
  const [whole, pieces] = [await folders(), await folders()];
  await (await begun(whole, from)).write(FIRST_START);
  await begun(pieces, from);
  for (let t = from; t <= FIRST_START; t += 7_777) await new LiveLoggers(pieces, () => t).write(t);
  await new LiveLoggers(pieces, () => 0).write(FIRST_START);
  const files = await contents(whole);
  expect(Object.keys(files).length).toBeGreaterThan(5);
  expect(await contents(pieces)).toEqual(files);
});

it('takes back what a run that was cut off left half written', async () => {
  const at = await folders();
  const loggers = await begun(at, FIRST_START - DAY_S);
  await loggers.write(FIRST_START - 7200);
  const before = await contents(at);
  const newest = Object.keys(before)
    .filter((name) => name.startsWith('mill-mast'))
    .at(-1) as string;
  await appendFile(path.join(at.loggerDir, newest), '2026-12-01 0');
  await new LiveLoggers(at, () => 0).write(FIRST_START - 7200);
  expect(await contents(at)).toEqual(before);
});

it('writes wide rows with a name a column and the logger’s own clock', async () => {
  const at = await folders();
  await (await begun(at, FIRST_START - 7200)).write(FIRST_START);
  const files = await contents(at);
  const mill = files[path.join('mill-mast', 'mill-mast_2026-11.csv')] as string;
  expect(mill.split('\n')[0]).toBe('time,T 2 m,T 10 m,T 30 m,T 60 m,RH 2 m,Wind 10 m,Pressure 2 m');
  expect(mill.trimEnd().split('\n').at(-1)).toMatch(
    /^2026-11-30 22:00:00,(-?\d+\.\d\d,){4}\d+\.\d,\d+\.\d,\d+\.\d$/,
  );
});

it('loses two to three rows in a hundred over a winter and never one around the first start for long', async () => {
  const at = await folders();
  const from = Date.UTC(2025, 10, 1, 7) / 1000;
  const rows = await (await begun(at, from)).write(from + 60 * DAY_S);
  const expected = 60 * (3 * 144 + 2 * 24);
  expect(rows / expected).toBeGreaterThan(0.97);
  expect(rows / expected).toBeLessThan(0.99);
}, 60_000);

it('refuses to write before it has begun, and says what to do', async () => {
  await expect(new LiveLoggers(await folders(), () => 0).write(1)).rejects.toThrow('have not begun');
});

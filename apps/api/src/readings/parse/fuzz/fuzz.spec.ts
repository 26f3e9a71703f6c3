import { readClock } from '../../../towers/time-keeping/logger-clock';
import { decodeText, NotTextError } from '../decode-text';
import { DEFAULT_MAPPING } from '../mapping';
import { HeaderError } from '../parsed-readings';
import { readCsv, type ReadingContext } from '../read-csv';
import { mutate } from './mutate';
import { strictCell, strictCells } from './strict-reader';

jest.setTimeout(60_000);

const FILES = 10_000;
const SEED = 20_260_110;
const T = Date.UTC(2026, 0, 10, 5) / 1000;
const NAMES = ['t2', 't10', 't30'];
const GIVEN: ReadingContext = {
  mapping: DEFAULT_MAPPING,
  sensorIds: new Map(NAMES.map((name, i) => [name, i + 1])),
  time: { clock: readClock('UTC')!, stamp: 'end', form: 'iso', intervalS: 600 },
  nowS: T + 86_400,
};
const GOOD = [
  'time,t2,t10,t30,battery',
  ...Array.from({ length: 12 }, (_, i) => {
    const stamp = new Date((T + i * 600) * 1000).toISOString();
    return [stamp, -9.5 - i / 10, -7.7 - i / 20, -5.6 + i / 40, 12.4].join(',');
  }),
].join('\n');

/** What is wrong with how a file was read; undefined when every reading is as the strict reader has it. */
async function faultOf(bytes: Buffer): Promise<string | undefined> {
  let text: string;
  try {
    text = decodeText(bytes);
  } catch (error) {
    return error instanceof NotTextError ? undefined : `threw ${String(error)}`;
  }
  const lines = text.split(/\r\n|\n|\r/);
  try {
    const { rows, refused } = await readCsv(text, GIVEN);
    for (const { sensorId, tEnd, value, rowNo } of rows) {
      const strict = strictCell(lines, rowNo, NAMES[sensorId - 1]!);
      if (strict.tEnd !== tEnd || strict.value !== value)
        return `row ${rowNo}: read ${value} at ${tEnd}, but it says ${strict.value} at ${strict.tEnd}`;
    }
    const bad = refused.find(({ text: why }) => !/^Row \d+(, column "[^]+")?: [^]+;[^]+\.$/u.test(why));
    if (bad) return `says no cure: ${bad.text}`;
    return lostLine(lines, new Set([...rows, ...refused].map(({ rowNo }) => rowNo)));
  } catch (error) {
    return error instanceof HeaderError && error.message.length > 20 ? undefined : `threw ${String(error)}`;
  }
}

/** A line that was neither read nor refused, though it holds something in a sensor's column. */
function lostLine(lines: readonly string[], spokenOf: ReadonlySet<number>): string | undefined {
  const head = lines.findIndex((line) => line.trim() !== '');
  const names = strictCells(lines[head] ?? '').map((name) => name.trim());
  const i = lines.findIndex((line, at) => {
    if (at <= head || spokenOf.has(at + 1) || line.trim() === '' || line === lines[head]) return false;
    return strictCells(line).some((cell, c) => NAMES.includes(names[c] ?? '') && !isNothing(cell));
  });
  return i < 0 ? undefined : `row ${i + 1} is lost: ${lines[i]}`;
}
const isNothing = (cell: string): boolean =>
  cell.trim() === '' || DEFAULT_MAPPING.missing.includes(cell.trim());

/** The fewest lines of a file that still show a fault. */
async function shrunk(text: string): Promise<string> {
  let lines = text.split('\n');
  for (let i = lines.length - 1; i >= 0; i--) {
    const without = lines.filter((_, at) => at !== i);
    if (await faultOf(Buffer.from(without.join('\n')))) lines = without;
  }
  return lines.join('\n');
}

describe('ten thousand files that went wrong on their way', () => {
  it('give no wrong number, lose no line, and say the cure', async () => {
    let taken = 0;
    for (let n = 0; n < FILES; n++) {
      const text = mutate(GOOD, SEED + n);
      const fault = await faultOf(Buffer.from(text));
      if (fault)
        throw new Error(`Seed ${SEED + n}: ${fault}\nIn short:\n${JSON.stringify(await shrunk(text))}`);
      taken += 1;
    }
    expect(taken).toBe(FILES);
  });

  it('give no wrong number when their bytes are damaged', async () => {
    for (let n = 0; n < 2_000; n++) {
      const bytes = Buffer.from(GOOD);
      for (let i = 0; i < 3; i++) bytes[(n * 31 + i * 7919 + SEED) % bytes.length]! ^= 1 << ((n + i) % 8);
      expect({ n, fault: await faultOf(bytes) }).toEqual({ n, fault: undefined });
    }
  });
});

import { readFile } from 'node:fs/promises';
import { parse } from 'csv-parse/sync';
import { OptionError } from './options.mjs';
import { blockEndOf, instantOf } from './stamps.mjs';

/** Bytes of lines sent at a time. */
const CHUNK_BYTES = 2_000_000;

const textOf = async (file) => {
  try {
    return await readFile(file, 'utf8');
  } catch (error) {
    throw new OptionError(
      `${file} cannot be read (${error.code ?? error.message}). Give the path of a CSV file.`,
    );
  }
};

/** One line as its cells; a line with stray quotation marks has none. */
const cellsOf = (line) => {
  try {
    return parse(line, { relax_column_count: true })[0] ?? [];
  } catch {
    return undefined;
  }
};

const splitLines = (text) => text.replace(/^\uFEFF/, '').split(/\r\n|\n|\r/);

/** The readings file: its lines to be sent, and how often each stamp and each block occurs in it. */
export async function readReadings(options) {
  const lines = splitLines(await textOf(options.readings));
  const headerAt = lines.findIndex((line) => line.trim() !== '');
  const header = (headerAt < 0 ? undefined : cellsOf(lines[headerAt]))?.map((cell) => cell.trim()) ?? [];
  for (const column of [options.time, ...options.levels.map((level) => level.column)]) {
    if (!header.includes(column)) {
      throw new OptionError(`${options.readings} has no column "${column}". It has: ${header.join(' | ')}`);
    }
  }
  const timeAt = header.indexOf(options.time);
  const stamps = new Map();
  const blocks = new Map();
  for (const line of lines.slice(headerAt + 1)) {
    const cell = line.trim() === '' ? undefined : cellsOf(line)?.[timeAt];
    const instant = cell === undefined ? undefined : instantOf(cell, options.offset);
    if (instant === undefined) continue;
    const block = blockEndOf(instant, options);
    stamps.set(instant, (stamps.get(instant) ?? 0) + 1);
    blocks.set(block, (blocks.get(block) ?? 0) + 1);
  }
  return { headerLine: lines[headerAt], headerAt, lines, stamps, blocks };
}

/** The lines after the header in parts, each with the header before it, and the file's row its first line has. */
export function* chunksOf({ headerLine, headerAt, lines }) {
  let [part, bytes, firstRow] = [[], 0, headerAt + 2];
  for (let i = headerAt + 1; i < lines.length; i += 1) {
    part.push(lines[i]);
    bytes += lines[i].length + 1;
    if (bytes < CHUNK_BYTES && i < lines.length - 1) continue;
    if (part.some((line) => line.trim() !== '')) yield { text: [headerLine, ...part].join('\r\n'), firstRow };
    [part, bytes, firstRow] = [[], 0, i + 2];
  }
}

const TIME_COLUMNS = ['time_utc', 'time_original', 'time'];

/** The truth: its rows with the instant of each, UTC epoch seconds. */
export async function readTruth(options) {
  const rows = parse(await textOf(options.truth), {
    columns: true,
    bom: true,
    skip_empty_lines: true,
    trim: true,
  });
  const column = [...TIME_COLUMNS, options.time].find((name) => rows[0] && name in rows[0]);
  if (!column) {
    throw new OptionError(`${options.truth} has no row, or no time column (${TIME_COLUMNS.join(', ')}).`);
  }
  const offset = column === 'time_utc' ? '+00:00' : options.offset;
  return rows.map((row) => ({ ...row, stamp: row[column], instant: instantOf(row[column], offset) }));
}

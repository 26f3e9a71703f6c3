import { parseArgs } from 'node:util';

export const USAGE = `Usage: npm run verify:tower -- --readings FILE --truth FILE --time COLUMN
         --level HEIGHT="COLUMN" [--level …] --block MINUTES
         [--stamp instant|start|middle|end] [--offset ±HH:MM] [--missing TEXT …]`;

/** An option that cannot be used; the message says what to give. */
export class OptionError extends Error {}

const options = {
  readings: { type: 'string' },
  truth: { type: 'string' },
  time: { type: 'string' },
  level: { type: 'string', multiple: true },
  block: { type: 'string' },
  stamp: { type: 'string', default: 'end' },
  offset: { type: 'string' },
  missing: { type: 'string', multiple: true },
};

/** `--offset -07:00` and `--missing -999` carry values that begin with a dash: tie them to their option. */
const tied = (args) => {
  const list = [];
  for (let i = 0; i < args.length; i += 1) {
    const name = /^--([a-z]+)$/.exec(args[i])?.[1];
    if (options[name]?.type === 'string' && i + 1 < args.length) list.push(`${args[i]}=${args[(i += 1)]}`);
    else list.push(args[i]);
  }
  return list;
};

const levelOf = (text) => {
  const at = text.indexOf('=');
  const heightM = Number(text.slice(0, at));
  const column = text.slice(at + 1).trim();
  if (at < 1 || !Number.isFinite(heightM) || column === '') {
    throw new OptionError(
      `--level ${text} is not HEIGHT="COLUMN", such as --level 3="Air Temperature (3 m)".`,
    );
  }
  return { heightM, column };
};

const checked = (values) => {
  for (const name of ['readings', 'truth', 'time', 'block']) {
    if (!values[name]) throw new OptionError(`--${name} is missing.\n${USAGE}`);
  }
  const levels = (values.level ?? []).map(levelOf).sort((a, b) => a.heightM - b.heightM);
  if (levels.length < 2) throw new OptionError(`Give two levels or more.\n${USAGE}`);
  if (new Set(levels.map((level) => level.heightM)).size < levels.length) {
    throw new OptionError('Two levels have the same height; give each height once.');
  }
  if (new Set(levels.map((level) => level.column)).size < levels.length) {
    throw new OptionError('Two levels have the same column; give each column once.');
  }
  const block = Number(values.block);
  if (!Number.isInteger(block) || block < 1 || block > 60) {
    throw new OptionError('--block is the length of a block in whole minutes, 1 to 60.');
  }
  if (!['instant', 'start', 'middle', 'end'].includes(values.stamp)) {
    throw new OptionError('--stamp is one of instant, start, middle, end.');
  }
  if (values.offset !== undefined && !/^[+-]\d{2}:\d{2}$/.test(values.offset)) {
    throw new OptionError('--offset is written ±HH:MM, such as -07:00.');
  }
  return { ...values, time: values.time.trim(), levels, blockS: block * 60, blockMinutes: block };
};

/** The options of a run, checked; throws an `OptionError` that says what to give. */
export function readOptions(args) {
  try {
    return checked(parseArgs({ args: tied(args), options, allowPositionals: false }).values);
  } catch (error) {
    if (error instanceof OptionError || !String(error?.code).startsWith('ERR_PARSE_ARGS')) throw error;
    throw new OptionError(`${error.message}\n${USAGE}`);
  }
}

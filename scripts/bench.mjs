import { existsSync, readdirSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import { parseArgs } from 'node:util';
import { ensureBuilt } from './house/build-steps.mjs';
import { Fault, runMain } from './house/fault.mjs';
import { ensureInstalled } from './house/install.mjs';
import { inRoot } from './house/root.mjs';

const SIZES = ['small', 'full'];

/** The names of what can be measured: one file each. */
const names = () =>
  readdirSync(inRoot('scripts/bench'))
    .filter((file) => file.endsWith('.mjs'))
    .map((file) => file.slice(0, -4));

/** A number as people read it. */
const shown = (value) =>
  typeof value === 'number' ? value.toLocaleString('en', { maximumSignificantDigits: 4 }) : String(value);

/**
 * `npm run bench -- NAME [--json] [--size small|full]`: each NAME is scripts/bench/NAME.mjs with
 * `export async function run({ size })`, which returns its figures by name; a figure is a number, or
 * `{ median, low, high }` of several rounds.
 */
await runMain(async () => {
  const options = { json: { type: 'boolean', default: false }, size: { type: 'string', default: 'small' } };
  const { values, positionals } = parseArgs({ options, allowPositionals: true });
  const [name] = positionals;
  if (positionals.length !== 1 || !existsSync(inRoot('scripts/bench', `${name}.mjs`))) {
    throw new Fault(`Say what to measure: npm run bench -- NAME, one of ${names().join(', ')}.`);
  }
  if (!SIZES.includes(values.size))
    throw new Fault(`--size is "${values.size}": give ${SIZES.join(' or ')}.`);
  await ensureInstalled();
  await ensureBuilt();
  const { run } = await import(pathToFileURL(inRoot('scripts/bench', `${name}.mjs`)).href);
  const measured = Object.entries(await run({ size: values.size }));
  for (const [key, value] of measured) {
    const spread = value?.median === undefined ? '' : `   (${shown(value.low)} to ${shown(value.high)})`;
    console.log(`${key.padEnd(24)} ${shown(value?.median ?? value).padStart(14)}${spread}`);
  }
  const figures = Object.fromEntries(measured.map(([key, value]) => [key, value?.median ?? value]));
  if (values.json) console.log(JSON.stringify({ name, figures }));
});

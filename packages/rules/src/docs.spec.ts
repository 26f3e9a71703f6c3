import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { MEASURE_NAMES, MEASURES, validateRule } from './index';
import * as api from './index';

const read = (...parts: string[]): string => readFileSync(path.join(__dirname, ...parts), 'utf8');
const source = readdirSync(__dirname, { recursive: true, encoding: 'utf8' })
  .filter((name) => /(?<!spec)\.ts$/.test(name) && !name.startsWith('testing'))
  .map((name) => read(name))
  .join('\n');
const functions = Object.entries(api).flatMap(([name, value]) => (typeof value === 'function' ? [name] : []));

/** The comment that stands right before an exported function. */
const docOf = (name: string): string =>
  new RegExp(`/\\*\\*((?:(?!\\*/)[\\s\\S])*)\\*/\\s*export function ${name}\\b`).exec(source)?.[1] ?? '';

test.each(functions)('%s says its units, where it is valid and its source', (name) => {
  const doc = docOf(name);
  for (const part of ['Units: ', 'Valid: ', 'Source: ']) expect(doc).toContain(part);
});

test('every reference of a docstring is listed, and every one listed is used', () => {
  const listed = [...read('..', 'REFERENCES.md').matchAll(/^\| \[(\w+)\]/gm)].map(([, key]) => key!);
  const used = new Set([...source.matchAll(/\[([A-Z][A-Za-z]*\d*)\](?=[ ,;.:])/g)].map(([, key]) => key!));
  expect([...used].sort()).toEqual(listed.sort());
});

test.each(MEASURE_NAMES)('%s is in the table of measures as the catalogue has it', (name) => {
  expect(read('..', 'README.md').replace(/ +/g, ' ')).toContain(`| \`${name}\` | `);
  expect(read('..', 'README.md')).toContain(MEASURES[name].docs);
});

test('the rule in the description is a valid one', () => {
  const [, json] = /```json\n([\s\S]*?)```/.exec(read('..', 'README.md'))!;
  expect(validateRule(JSON.parse(json!))).toEqual({ ok: true, rule: JSON.parse(json!) });
});

import { ensureBuilt } from './house/build-steps.mjs';
import { ensureChromium } from './house/chromium.mjs';
import { run, runBin } from './house/command.mjs';
import { countedScript, oneCheck } from './house/counted-script.mjs';
import { Fault } from './house/fault.mjs';
import { ensureInstalled } from './house/install.mjs';
import { runJest } from './house/jest-run.mjs';
import { inRoot } from './house/root.mjs';

/** Zones in which the pure packages are tested again: east, west with summer time, and a half hour. */
const OTHER_ZONES = ['Pacific/Auckland', 'America/St_Johns', 'Asia/Kolkata'];
const PURE = ['atmosphere', 'rules', 'contracts'];
const script = (file, ...args) => run(process.execPath, [inRoot('scripts', file), ...args]);

const tool = (file, ...args) => oneCheck(runBin(file, args));
const LINTED = ['apps', 'packages', 'scripts'];
const FORMATTED = [...LINTED, 'fixtures'];

/** What only reads the sources, in two rows that run side by side: linting takes as long as the rest. */
const CHECKS = [
  [
    [
      'lint',
      () =>
        tool(
          'eslint/bin/eslint.js',
          ...['-c', 'packages/tooling/eslint.config.mjs', '--max-warnings', '0', ...LINTED],
        ),
    ],
  ],
  [
    ['types', () => oneCheck(script('types.mjs'))],
    ['openapi', () => oneCheck(script('openapi.mjs', '--check'))],
    ['format', () => tool('prettier/bin/prettier.cjs', '--log-level', 'warn', '--check', ...FORMATTED)],
  ],
];
const TESTS = [
  ['unit and API tests', () => runJest()],
  ...OTHER_ZONES.map((TZ) => [`packages in ${TZ}`, () => runJest({ projects: PURE, env: { TZ } })]),
  ['browser', async () => countedScript('apps/web/e2e/run.mjs', [], { CHROMIUM: await ensureChromium() })],
];

/** Runs one step; what keeps it from running at all is said and counts as one failed. */
async function counted(step) {
  try {
    return await step();
  } catch (error) {
    console.error(error instanceof Fault ? error.message : error);
    return { passed: 0, failed: 1 };
  }
}

const results = [];
/** Runs steps one after the other. */
async function inTurn(steps) {
  for (const [name, step] of steps) {
    console.log(`\n== ${name}`);
    const begun = Date.now();
    const result = await counted(step);
    results.push([`${name} (${Math.round((Date.now() - begun) / 1000)} s)`, result]);
  }
}

const prepared = await counted(async () => {
  await ensureInstalled();
  await ensureBuilt();
  return { passed: 1, failed: 0 };
});
results.push(['install and build', prepared]);
if (prepared.failed === 0) {
  await Promise.all(CHECKS.map(inTurn));
  await inTurn(TESTS);
}

console.log('');
for (const [name, { passed, failed }] of results) console.log(`${name}: ${passed} passed, ${failed} failed`);
const sum = (key) => results.reduce((total, [, result]) => total + result[key], 0);
process.exitCode = sum('failed') === 0 ? 0 : 1;
console.log(`${sum('passed')} passed, ${sum('failed')} failed`);

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

const STEPS = [
  [
    'lint',
    () =>
      oneCheck(
        runBin('eslint/bin/eslint.js', [
          '-c',
          'packages/tooling/eslint.config.mjs',
          '--max-warnings',
          '0',
          'apps',
          'packages',
          'scripts',
        ]),
      ),
  ],
  [
    'format',
    () =>
      oneCheck(
        runBin('prettier/bin/prettier.cjs', [
          '--log-level',
          'warn',
          '--check',
          'apps',
          'packages',
          'scripts',
          'fixtures',
        ]),
      ),
  ],
  ['types', () => oneCheck(script('types.mjs'))],
  ['openapi', () => oneCheck(script('openapi.mjs', '--check'))],
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
const prepared = await counted(async () => {
  await ensureInstalled();
  await ensureBuilt();
  return { passed: 1, failed: 0 };
});
results.push(['install and build', prepared]);
if (prepared.failed === 0) {
  for (const [name, step] of STEPS) {
    console.log(`\n== ${name}`);
    const begun = Date.now();
    const result = await counted(step);
    results.push([`${name} (${Math.round((Date.now() - begun) / 1000)} s)`, result]);
  }
}

console.log('');
for (const [name, { passed, failed }] of results) console.log(`${name}: ${passed} passed, ${failed} failed`);
const sum = (key) => results.reduce((total, [, result]) => total + result[key], 0);
process.exitCode = sum('failed') === 0 ? 0 : 1;
console.log(`${sum('passed')} passed, ${sum('failed')} failed`);

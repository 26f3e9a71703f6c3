import { existsSync } from 'node:fs';
import { runBin } from './command.mjs';
import { Fault } from './fault.mjs';
import { fingerprint, isNoted, note } from './fingerprint.mjs';
import { inRoot } from './root.mjs';

const PACKAGES = ['packages/atmosphere', 'packages/contracts', 'packages/rules'];
const TOOLS = ['package-lock.json', 'packages/tooling'];

/** What is built: from which folders, by which command, and a file that must then be there. */
const STEPS = [
  {
    name: 'server',
    from: [...TOOLS, ...PACKAGES, 'apps/api', 'apps/local-services'],
    made: ['apps/api/dist/main.js', 'apps/local-services/dist/main.js', 'packages/rules/dist/index.js'],
    build: () =>
      runBin('typescript/bin/tsc', ['-b', ...PACKAGES, 'apps/api', 'apps/local-services'], { quiet: true }),
  },
  {
    name: 'web',
    from: [...TOOLS, ...PACKAGES, 'apps/web'],
    made: ['apps/web/dist/index.html'],
    build: () =>
      runBin('vite/bin/vite.js', ['build', '--logLevel', 'warn'], { quiet: true, cwd: inRoot('apps/web') }),
  },
];

/**
 * Builds what is out of date, the server's programs first.
 *
 * @param {boolean} [anew] builds even what is up to date
 */
export async function ensureBuilt(anew = false) {
  for (const { name, from, made, build } of STEPS) {
    const print = fingerprint(...from);
    if (!anew && isNoted(`built-${name}`, print) && made.every((file) => existsSync(inRoot(file)))) continue;
    console.log(`Building the ${name} …`);
    const { code, output } = await build();
    if (code !== 0) throw new Fault(`${output.trimEnd()}\nThe ${name} could not be built.`);
    note(`built-${name}`, print);
  }
}

import { existsSync, statSync } from 'node:fs';
import { run } from './command.mjs';
import { Fault } from './fault.mjs';
import { fingerprint, isNoted, note } from './fingerprint.mjs';
import { inRoot } from './root.mjs';

/** npm writes this file last, so a cut-off install has none. */
const INSTALLED = 'node_modules/.package-lock.json';

/** Somebody who ran npm by hand after the lock file last changed has installed what it says. */
function installedByHand() {
  const installed = statSync(inRoot(INSTALLED), { throwIfNoEntry: false });
  return installed !== undefined && installed.mtimeMs >= statSync(inRoot('package-lock.json')).mtimeMs;
}

/** Says so and ends when this Node is not one the product is built for. */
function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major === 20 && minor >= 19) return;
  if (major > 20) {
    console.warn(`This is Node ${process.versions.node}; Lidwatch is tested on Node 20.19 and later 20.`);
    return;
  }
  throw new Fault(`This is Node ${process.versions.node}. Install Node 20.19 or a later 20 and start again.`);
}

/** Installs the packages when they are missing or the lock file has changed since. */
export async function ensureInstalled() {
  checkNode();
  const print = fingerprint('package-lock.json');
  if (existsSync(inRoot(INSTALLED)) && (isNoted('installed', print) || installedByHand())) return;
  console.log('Installing packages (npm ci); on a new machine this takes two or three minutes …');
  const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm';
  const { code } = await run(npm, ['ci', '--no-progress']);
  if (code !== 0)
    throw new Fault(
      'The packages could not be installed; npm says why above. Put that right and start again.',
    );
  note('installed', print);
}

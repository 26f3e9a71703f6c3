import { createHash } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { inRoot } from './root.mjs';

const LEFT_OUT = new Set(['node_modules', 'dist', 'coverage']);

function addTo(hash, place) {
  const stats = statSync(place, { throwIfNoEntry: false });
  if (!stats) return;
  if (stats.isDirectory()) {
    for (const name of readdirSync(place).sort())
      if (!LEFT_OUT.has(name)) addTo(hash, path.join(place, name));
  } else if (!place.endsWith('.tsbuildinfo')) {
    hash.update(`${place}\0`).update(readFileSync(place));
  }
}

/** One text for the contents of files and folders, built ones left out. */
export function fingerprint(...places) {
  const hash = createHash('sha256');
  for (const place of places) addTo(hash, inRoot(place));
  return hash.digest('hex');
}

const noteFile = (name) => inRoot('node_modules/.cache/lidwatch', name);

/** Whether a step was last done with this fingerprint. */
export function isNoted(name, print) {
  try {
    return readFileSync(noteFile(name), 'utf8') === print;
  } catch (error) {
    if (error.code === 'ENOENT') return false;
    throw error;
  }
}

/** Notes with which fingerprint a step was done. */
export function note(name, print) {
  mkdirSync(path.dirname(noteFile(name)), { recursive: true });
  writeFileSync(noteFile(name), print);
}

import { spawn } from 'node:child_process';
import { pathToFileURL } from 'node:url';
import { inRoot } from './root.mjs';

/** How long a process may take to end by itself before it is ended, ms. */
const PATIENCE_MS = 10_000;

const END_WITH_PARENT = pathToFileURL(inRoot('scripts/house/end-with-parent.mjs')).href;

/**
 * Starts one of the product's programs.
 *
 * @param {string} name for people
 * @param {string} file below the top folder
 * @param {object} env
 * @param {(line: string) => void} onLine every line it prints
 */
export function startChild(name, file, env, onLine) {
  const child = spawn(process.execPath, ['--import', END_WITH_PARENT, inRoot(file)], {
    env: { ...process.env, ...env },
    stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
    detached: true,
  });
  const ended = new Promise((resolve) => child.once('close', (code, signal) => resolve(signal ?? code)));
  for (const stream of [child.stdout, child.stderr]) {
    let rest = '';
    stream.setEncoding('utf8').on('data', (text) => {
      const lines = (rest + text).split('\n');
      rest = lines.pop();
      lines.forEach(onLine);
    });
    stream.on('end', () => rest && onLine(rest));
  }
  return {
    name,
    ended,
    /** Asks it to end and waits; after ten seconds it is ended. */
    async stop() {
      if (child.exitCode !== null || child.signalCode !== null) return;
      child.kill('SIGTERM');
      const timer = setTimeout(() => child.kill('SIGKILL'), PATIENCE_MS);
      await ended;
      clearTimeout(timer);
    },
  };
}

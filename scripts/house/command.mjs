import { spawn } from 'node:child_process';
import { inRoot, root } from './root.mjs';

/** The file of a command that a package brings, run by this Node: no shell, no PATH. */
export const binOf = (file) => inRoot('node_modules', file);

/**
 * Runs a command in the top folder and waits for it.
 *
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{env?: object, quiet?: boolean, onOutput?: (text: string) => void, cwd?: string}} [options] quiet keeps the
 *   output, which is returned; else it is shown as it comes
 * @returns {Promise<{code: number, output: string}>}
 */
export function run(command, args, { env = {}, quiet = false, onOutput, cwd = root } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    const take = (to) => (chunk) => {
      output += chunk;
      onOutput?.(String(chunk));
      if (!quiet) to.write(chunk);
    };
    child.stdout.on('data', take(process.stdout));
    child.stderr.on('data', take(process.stderr));
    child.on('error', reject);
    child.on('close', (code, signal) => resolve({ code: code ?? (signal ? 1 : 0), output }));
  });
}

/** Runs a script of a package by this Node. */
export const runBin = (file, args, options) => run(process.execPath, [binOf(file), ...args], options);

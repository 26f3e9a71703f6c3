import { inRoot } from './root.mjs';
import { run } from './command.mjs';

/**
 * Runs a script of ours whose last line is "N passed, N failed" and reads that line.
 *
 * @param {string} file below the top folder
 */
export async function countedScript(file, args = [], env = {}) {
  const { code, output } = await run(process.execPath, [inRoot(file), ...args], { env });
  const [, passed, failed] = /(\d+) passed, (\d+) failed\s*$/.exec(output) ?? [];
  if (passed === undefined) return { passed: 0, failed: 1 };
  return { passed: Number(passed), failed: code !== 0 && failed === '0' ? 1 : Number(failed) };
}

/** Runs something that is in order or not: one passed or one failed. */
export async function oneCheck(running) {
  const { code } = await running;
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

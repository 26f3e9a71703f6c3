import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { runBin } from './command.mjs';

/**
 * Runs Jest projects and counts their tests; a suite that could not be run counts as one failed, and so does a test
 * that was left out, because nothing here is left out on purpose.
 *
 * @param {{projects?: readonly string[], env?: object}} [options] all projects unless named
 */
export async function runJest({ projects = [], env = {} } = {}) {
  const dir = mkdtempSync(path.join(os.tmpdir(), 'lidwatch-test-'));
  const file = path.join(dir, 'result.json');
  try {
    const args = ['-c', 'packages/tooling/jest.config.cjs', '--json', `--outputFile=${file}`];
    const chosen = projects.length > 0 ? ['--selectProjects', ...projects] : [];
    const { code } = await runBin('jest/bin/jest.js', [...args, ...chosen], { env });
    const result = JSON.parse(readFileSync(file, 'utf8'));
    const failed =
      result.numFailedTests + result.numRuntimeErrorTestSuites + result.numPendingTests + result.numTodoTests;
    return { passed: result.numPassedTests, failed: failed > 0 || code === 0 ? failed : 1 };
  } finally {
    rmSync(dir, { recursive: true, force: true });
  }
}

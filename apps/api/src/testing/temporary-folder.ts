import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

/** A new folder of its own for a test, and how to remove it. */
export function temporaryFolder(): { folder: string; remove: () => void } {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'lidwatch-test-'));
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
}

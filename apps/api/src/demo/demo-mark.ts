import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { StartFault } from '../common/start-fault';
import { storeFile } from '../database/store-options';

/** What a data folder says of the demo. */
export type DemoState = 'nothing yet' | 'cut off' | 'fed' | 'without demo';

const markFile = (dataDir: string): string => path.join(dataDir, 'demo.json');

/**
 * What a data folder holds: nothing, a demo whose feeding was cut off, a demo, or an installation without one. Throws
 * a StartFault when the mark cannot be read.
 */
export function demoState(dataDir: string): DemoState {
  const file = markFile(dataDir);
  if (!existsSync(file)) return existsSync(storeFile(dataDir)) ? 'without demo' : 'nothing yet';
  try {
    const { state } = JSON.parse(readFileSync(file, 'utf8')) as { state?: unknown };
    if (state === 'fed') return 'fed';
    if (state === 'being fed') return 'cut off';
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
  }
  throw new StartFault(
    `${file} is damaged: remove it together with the data folder, and the demo is fed in anew.`,
  );
}

/** Notes that the demo is being fed in, or that it has been. */
export function markDemo(dataDir: string, state: 'being fed' | 'fed'): void {
  writeFileSync(markFile(dataDir), JSON.stringify({ state }));
}

/** Removes the store of a demo whose feeding was cut off, and only that. */
export function removeHalfDemo(dataDir: string): void {
  for (const ending of ['', '-wal', '-shm', '-journal']) rmSync(storeFile(dataDir) + ending, { force: true });
}

import os from 'node:os';
import type { ThreadCall } from './compute-task';

/** Gives way to whatever answers requests. On Linux a priority belongs to the thread that sets it. */
const NICE = 5;

if (process.platform === 'linux') os.setPriority(0, NICE);

/** The entry of the compute thread: runs an exported function of a built file. */
export default async function runTask({ file, name, given }: ThreadCall): Promise<unknown> {
  const found = (await import(file)) as Record<string, (given: unknown) => unknown>;
  const work = found[name];
  if (!work) throw new Error(`${file} exports no ${name}.`);
  return work(given);
}

/**
 * Figure `replay`: a rule of six clauses replayed over winters of 15-min blocks of three towers, as a back-test does
 * it, in a worker: `loadSeconds` reads the blocks from a SQLite file into columns, `seconds` judges them all and
 * replays the notices.
 */
import { Worker } from 'node:worker_threads';
import { URL } from 'node:url';

const WINTERS = { small: 2, full: 10 };
const ROUNDS = { small: 7, full: 9 };

/** Measures replaying in a worker; answers medians with their spread. */
export async function run({ size }) {
  const worker = new Worker(new URL('./replay/worker.mjs', import.meta.url), {
    workerData: { winters: WINTERS[size], towers: 3, rounds: ROUNDS[size] },
  });
  return new Promise((resolve, reject) => {
    worker.once('message', resolve);
    worker.once('error', reject);
  });
}

import { readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { Client } from '../verify-tower/client.mjs';
import { startService } from '../verify-tower/service.mjs';
import { makeTower, waitUntilWorkedOut } from '../verify-tower/through-the-service.mjs';
import { askMeanwhile } from './ingest/ask-meanwhile.mjs';
import { uploadFile } from './ingest/upload-file.mjs';
import { HEIGHTS_M, winterFile } from './ingest/winter.mjs';
import { importSeconds } from './ingest/yardstick.mjs';

/** Readings of a round, and how many rounds. */
const SIZES = { small: { readings: 100_000, rounds: 2 }, full: { readings: 1_000_000, rounds: 3 } };
const loopDelay = fileURLToPath(new URL('./ingest/loop-delay.cjs', import.meta.url));

const tower = {
  ...{ time: 'time', stamp: 'end', blockMinutes: 5, missing: [] },
  levels: HEIGHTS_M.map((heightM) => ({ heightM, column: `t${heightM}` })),
};

/** Largest memory a process has held, MB (Linux). */
const peakMemoryMb = async (pid) => {
  const status = await readFile(`/proc/${pid}/status`, 'utf8');
  return Number(/VmHWM:\s+(\d+) kB/.exec(status)?.[1]) / 1024;
};

/** One file through a service with an empty store, from the last byte sent until every profile is worked out. */
async function importThroughService(readings) {
  process.env.NODE_OPTIONS = `--require ${loopDelay}`;
  process.env.LOOP_DELAY_FILE = path.join(tmpdir(), `lidwatch-loop-${process.pid}.json`);
  const service = await startService();
  try {
    const client = new Client(service.url);
    const { towerId } = await makeTower(client, service.token, tower);
    const id = await uploadFile(client, towerId, winterFile(readings));
    const stopAsking = askMeanwhile(client);
    const begun = performance.now();
    await client.post(`/api/uploads/${id}/commit`, { mapping: { timeColumn: 'time' } });
    await uploadFile.done(client, id, readings);
    const importedS = (performance.now() - begun) / 1000;
    await waitUntilWorkedOut(client, towerId);
    const seconds = (performance.now() - begun) / 1000;
    const { p99Ms, maxMs } = JSON.parse(await readFile(process.env.LOOP_DELAY_FILE, 'utf8'));
    const otherP95Ms = await stopAsking();
    return { seconds, importedS, memoryMb: await peakMemoryMb(service.pid), otherP95Ms, p99Ms, maxMs };
  } finally {
    await service.close();
    await rm(process.env.LOOP_DELAY_FILE, { force: true });
  }
}

const spread = (values) => {
  const sorted = [...values].sort((a, b) => a - b);
  return { median: sorted[Math.floor((sorted.length - 1) / 2)], low: sorted[0], high: sorted.at(-1) };
};

/**
 * Generated readings as one uploaded file through the real way in, screening and profiles included, against the
 * sqlite3 command line importing the same rows into the same table; both in turn, medians. A file of a fifth of the
 * size shows whether memory grows with it.
 */
export async function run({ size }) {
  const { readings, rounds } = SIZES[size];
  const fifth = await importThroughService(readings / 5);
  const found = [];
  for (let round = 0; round < rounds; round += 1) {
    const yardstickS = await importSeconds(readings);
    found.push({ ...(await importThroughService(readings)), yardstickS });
  }
  const each = (key) => spread(found.map((round) => round[key]));
  return {
    rows: readings,
    seconds: each('seconds'),
    importedSeconds: each('importedS'),
    rowsPerSecond: spread(found.map(({ seconds }) => readings / seconds)),
    ...(found[0].yardstickS && {
      ratioToSqliteImport: spread(found.map(({ seconds, yardstickS }) => seconds / yardstickS)),
    }),
    peakMemoryMb: each('memoryMb'),
    peakMemoryMbOfAFifth: fifth.memoryMb,
    otherRequestsP95Ms: each('otherP95Ms'),
    eventLoopP99Ms: each('p99Ms'),
    eventLoopMaxMs: each('maxMs'),
  };
}

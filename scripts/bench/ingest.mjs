import { readFile } from 'node:fs/promises';
import { Client } from '../verify-tower/client.mjs';
import { startService } from '../verify-tower/service.mjs';
import { makeTower, waitUntilWorkedOut } from '../verify-tower/through-the-service.mjs';
import { HEIGHTS_M, winterParts } from './ingest/winter.mjs';
import { importSeconds } from './ingest/yardstick.mjs';

const READINGS = { small: 100_000, full: 1_000_000 };
const ASK_EVERY_MS = 40;
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

const tower = {
  ...{ time: 'time', stamp: 'end', blockMinutes: 5, missing: [] },
  levels: HEIGHTS_M.map((heightM) => ({ heightM, column: `t${heightM}` })),
};

/** Asks for the list of towers every so often, as a screen would; gives the p95 of the answers' times, ms. */
function askMeanwhile(client) {
  const times = [];
  let going = true;
  const asking = (async () => {
    while (going) {
      const begun = performance.now();
      await client.get('/api/towers');
      times.push(performance.now() - begun);
      await pause(ASK_EVERY_MS);
    }
  })();
  return async () => {
    going = false;
    await asking;
    return times.sort((a, b) => a - b)[Math.floor(times.length * 0.95)];
  };
}

/** Largest memory a process has held, MB (Linux). */
const peakMemoryMb = async (pid) => {
  const status = await readFile(`/proc/${pid}/status`, 'utf8');
  return Number(/VmHWM:\s+(\d+) kB/.exec(status)?.[1]) / 1024;
};

/**
 * Sends generated readings through the real way in of a service with an empty store, until every profile is worked
 * out, against the sqlite3 command line importing the same rows into the same table.
 */
export async function run({ size }) {
  const rows = READINGS[size];
  const yardstick = await importSeconds(rows);
  const service = await startService();
  try {
    const client = new Client(service.url);
    const { towerId, key } = await makeTower(client, service.token, tower);
    const stopAsking = askMeanwhile(client);
    const begun = performance.now();
    for (const text of winterParts(rows)) {
      await client.request('POST', '/api/ingest/readings', { text, type: 'text/csv', key });
    }
    await waitUntilWorkedOut(client, towerId);
    const seconds = (performance.now() - begun) / 1000;
    return {
      rows,
      seconds,
      rowsPerSecond: rows / seconds,
      ...(yardstick && { ratioToSqliteImport: seconds / yardstick }),
      peakMemoryMb: await peakMemoryMb(service.pid),
      otherRequestsP95Ms: await stopAsking(),
    };
  } finally {
    await service.close();
  }
}

import { chunksOf } from './files.mjs';

const PAGE = 2000;
const STALLED_MS = 120_000;
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Makes the administrator, the tower with its levels, its layout and its key; screening only reports. */
export async function makeTower(client, token, options) {
  const password = 'a-long-password-for-one-run-only';
  const person = { token, name: 'Verifier', email: 'verifier@pellworth.example', password };
  await client.post('/api/auth/first-administrator', person);
  const tower = await client.post('/api/towers', {
    ...{ name: 'Tower under test', elevationM: 0, latitude: 0, longitude: 0 },
    ...{ intervalMinutes: options.blockMinutes, blockMinutes: options.blockMinutes },
    ...{ clock: options.offset ?? 'UTC', stamp: options.stamp },
    ...{ screening: 'report-only', inversionForm: 'plain', embedDepthM: 0 },
  });
  for (const { heightM, column } of options.levels) {
    const sensor = { name: column, quantity: 'air temperature', heightM, limits: 0.2 };
    await client.post(`/api/towers/${tower.id}/sensors`, sensor);
  }
  const mapping = { timeColumn: options.time, missing: ['NaN', ...(options.missing ?? [])] };
  await client.post(`/api/towers/${tower.id}/sources`, { kind: 'push', mapping });
  const { key } = await client.post(`/api/towers/${tower.id}/keys`, { name: 'verifier' });
  return { towerId: tower.id, key };
}

/** Sends the whole file part by part; gives the counts and the refused rows, numbered as in the file. */
export async function sendReadings(client, key, readings) {
  const total = { new: 0, repeated: 0, corrected: 0, refused: 0, refusedRows: [], ignoredColumns: new Set() };
  for (const { text, firstRow } of chunksOf(readings)) {
    const sent = await client.request('POST', '/api/ingest/readings', { text, type: 'text/csv', key });
    for (const count of ['new', 'repeated', 'corrected', 'refused']) total[count] += sent[count];
    for (const column of sent.ignoredColumns) total.ignoredColumns.add(column);
    for (const { row, code, text: why } of sent.refusedRows) {
      const inFile = row + firstRow - 2;
      total.refusedRows.push({ row: inFile, code, text: why.replace(/^Row \d+/, `Row ${inFile}`) });
    }
  }
  return total;
}

/** Waits until nothing of the tower waits to be worked out; throws when nothing moves for long. */
export async function waitUntilWorkedOut(client, towerId) {
  let [least, since] = [Infinity, Date.now()];
  for (;;) {
    const { pending } = await client.get(`/api/towers/${towerId}/pipeline`);
    if (pending === 0) return;
    if (pending < least) [least, since] = [pending, Date.now()];
    if (Date.now() - since > STALLED_MS) throw new Error(`${pending} blocks wait and nothing moves.`);
    await pause(200);
  }
}

/** Every profile of the tower by the end of its block, UTC epoch seconds, read page by page. */
export async function readProfiles(client, towerId) {
  const profiles = new Map();
  let from = '1990-01-01T00:00:00Z';
  while (from) {
    const page = await client.get(
      `/api/towers/${towerId}/profiles?limit=${PAGE}&from=${encodeURIComponent(from)}`,
    );
    for (const profile of page.items) profiles.set(Date.parse(profile.tEnd) / 1000, profile);
    from = page.next;
  }
  return profiles;
}

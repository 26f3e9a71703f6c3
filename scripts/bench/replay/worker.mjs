import { mkdtemp, rm } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { performance } from 'node:perf_hooks';
import { parentPort, workerData } from 'node:worker_threads';
import { blocksOfWinters } from './winters.mjs';
import { openStore } from './store.mjs';

const { blockColumns, replayRule, validateRule } = createRequire(import.meta.url)('@lidwatch/rules');

const strong = { measure: 'inversionStrengthC', op: '>=', value: 2, heldMinutes: 120 };
const smoky = { measure: 'pm25NowCast', op: '>=', value: 20 };
/** Six clauses: three to begin, three to end. */
const RULE = {
  begin: { all: [strong, { measure: 'inversionSure', op: '=', value: true }, smoky] },
  end: {
    all: [
      { measure: 'pm25NowCast', op: '<', value: 15, heldMinutes: 120 },
      {
        any: [
          { measure: 'strengthWithinTowerC', op: '<', value: 1 },
          { measure: 'windSpeedMPerS', op: '>', value: 4 },
        ],
      },
    ],
    heldMinutes: 60,
  },
  longestValidityHours: 24,
};
const MEASURES = [
  'inversionStrengthC',
  'inversionSure',
  'pm25NowCast',
  'strengthWithinTowerC',
  'windSpeedMPerS',
];

const localMoment = (t) => {
  const local = new Date((t - 7 * 3600) * 1000);
  return { month: local.getUTCMonth() + 1, day: local.getUTCDate(), hour: local.getUTCHours() };
};

const spread = (values) => {
  const sorted = [...values].sort((a, b) => a - b);
  return { median: sorted[sorted.length >> 1], low: sorted[0], high: sorted.at(-1) };
};

const valid = validateRule({ advisory: RULE });
if (!valid.ok) throw new Error(valid.problems.map(({ text }) => text).join(' '));

const folder = await mkdtemp(path.join(tmpdir(), 'lidwatch-replay-'));
try {
  const store = await openStore(path.join(folder, 'blocks.db'));
  const { winters, towers, rounds } = workerData;
  for (let tower = 1; tower <= towers; tower += 1) await store.keep(tower, blocksOfWinters(winters, tower));

  const loading = performance.now();
  const columns = [];
  for (let tower = 1; tower <= towers; tower += 1)
    columns.push(blockColumns(await store.read(tower), MEASURES));
  const loadSeconds = (performance.now() - loading) / 1000;
  await store.close();

  const seconds = [];
  let notices = 0;
  for (let round = 0; round < rounds; round += 1) {
    const begun = performance.now();
    notices = columns.reduce((sum, each) => sum + replayRule(RULE, each, localMoment).length, 0);
    seconds.push((performance.now() - begun) / 1000);
  }
  if (notices === 0) throw new Error('The replay led to no notice at all: it measured nothing.');
  const blocks = columns.reduce((sum, { tEnd }) => sum + tEnd.length, 0);
  const took = spread(seconds);
  parentPort.postMessage({ seconds: took, loadSeconds, blocks, blocksPerSecond: blocks / took.median });
} finally {
  await rm(folder, { recursive: true, force: true });
}

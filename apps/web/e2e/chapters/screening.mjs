import { look } from '../look.mjs';
import { sure } from '../steps.mjs';
import { until } from '../until.mjs';
import { apiOf, pushLines } from '../valley.mjs';

const INTERVAL_S = 600;
const HEIGHTS_M = [2, 10, 30];
/** How long the middle sensor has given one value, and how long it was wrong before that, in readings. */
const STUCK = 24;
const DRIFTING = 6;
const WORKED_OUT_WITHIN_MS = 12_000;

/** As the administrator: a second tower with its sensors and a key. */
async function makeBench(api) {
  const place = { latitude: 44.1, longitude: -112.9, elevationM: 1290 };
  const logger = { intervalMinutes: 10, blockMinutes: 10, clock: 'UTC', stamp: 'end' };
  const tower = await api.post('/api/towers', { name: 'Bench mast', ...place, ...logger });
  for (const heightM of HEIGHTS_M) {
    const sensor = { name: `T ${heightM} m`, quantity: 'air temperature', heightM, limits: 0.1 };
    await api.post(`/api/towers/${tower.id}/sensors`, sensor);
  }
  const { key } = await api.post(`/api/towers/${tower.id}/keys`, { name: 'journey' });
  return { id: tower.id, key };
}

/** A clear night that grows colder at the ground; its middle sensor drifts upward for an hour, then stands still. */
function stuckNight(nowMs) {
  const last = Math.floor(nowMs / 1000 / INTERVAL_S) * INTERVAL_S - 3600;
  const lines = Array.from({ length: 48 }, (_, i) => {
    const t = last - (47 - i) * INTERVAL_S;
    const wobble = ((i * 7) % 10) / 40;
    const stuckFor = i - (48 - STUCK - DRIFTING);
    const middle = stuckFor < 0 ? -5 - i * 0.06 + wobble : Math.min(0.8 * stuckFor, 4.8) - 6.8;
    const values = [-6 - i * 0.12 + wobble, middle, -4 - i * 0.04 - wobble];
    return [new Date(t * 1000).toISOString(), ...values.map((value) => value.toFixed(2))].join(',');
  });
  return { header: ['time', ...HEIGHTS_M.map((z) => `T ${z} m`)].join(','), lines };
}

/** An analyst finds a stuck sensor, sets it aside, sees what that changes, and takes it back. */
export async function screening({ step, product, admin, analyst }) {
  const newest = analyst.locator('ul[aria-live] li').first();
  const toldOf = (cause) =>
    newest
      .filter({ hasText: cause })
      .getByText(/changed/)
      .waitFor({ timeout: WORKED_OUT_WITHIN_MS });

  await step('a tower whose middle sensor stands still shows so', async () => {
    const bench = await makeBench(apiOf(admin));
    const pushed = await pushLines(product.url, bench.key, stuckNight(Date.now()));
    sure(pushed.refused === 0, `every reading is taken: ${JSON.stringify(pushed)}`);
    const waiting = () => apiOf(analyst).get(`/api/towers/${bench.id}/pipeline`);
    await until('its readings are screened', async () => (await waiting()).pending === 0);
    await analyst.goto(`/readings/towers/${bench.id}?days=3`);
    await analyst.getByRole('heading', { name: 'Readings of Bench mast' }).waitFor();
    await analyst.getByText('The very same value for 3 h or more while another level moved').waitFor();
    await look(analyst, '60-tower-readings');
  });

  await step('the analyst sets it aside with a reason, and sees what that changed', async () => {
    await analyst.getByRole('button', { name: 'Show T 10 m, stuck' }).click();
    const first = analyst.getByLabel('First reading');
    const begin = new Date(`${await first.inputValue()}Z`);
    await first.fill(new Date(begin.getTime() - DRIFTING * INTERVAL_S * 1000).toISOString().slice(0, 16));
    await analyst.getByRole('button', { name: 'Set aside…' }).click();
    await analyst.getByLabel('Reason').fill('Cable loose, seen on site');
    await analyst.getByRole('button', { name: 'Set aside', exact: true }).click();
    await toldOf('T 10 m set aside: Cable loose, seen on site');
    await analyst.getByRole('button', { name: 'Undo, T 10 m: Cable loose, seen on site' }).waitFor();
  });

  await step('and undoes it; who did what stays on the record', async () => {
    await analyst.getByRole('button', { name: 'Undo, T 10 m: Cable loose, seen on site' }).click();
    await analyst.getByRole('button', { name: 'Undo it' }).click();
    await toldOf('T 10 m: setting aside undone');
    const spans = analyst.getByRole('table', { name: 'Spans set by people' });
    await spans
      .getByText(/^undone/)
      .first()
      .waitFor();
    sure((await spans.innerText()).includes('Tomas Reyle'), 'the record names who set it');
  });
}

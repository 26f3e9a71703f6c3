import { readFileSync } from 'node:fs';
import { look } from '../look.mjs';
import { sure } from '../steps.mjs';
import { until } from '../until.mjs';
import { apiOf } from '../valley.mjs';

const HEIGHTS_M = [2, 10, 30];
const ROWS = 36;
/** What a logger may write by mistake, by the row of the file it stands in. */
const BAD_ROWS = { 12: '05/11/2025 2x:30;17,9;20,3;24,4;12,6', 20: '05/11/2025 22:50;17,2;--?;23,8;12,6' };

/** As the administrator: a tower whose logger nobody has connected. */
async function makeQuarry(api) {
  const place = { latitude: 44.2, longitude: -112.8, elevationM: 1220 };
  const logger = { intervalMinutes: 10, blockMinutes: 10, clock: 'UTC', stamp: 'end' };
  const tower = await api.post('/api/towers', { name: 'Quarry mast', ...place, ...logger });
  for (const heightM of HEIGHTS_M) {
    const sensor = { name: `T ${heightM} m`, quantity: 'air temperature', heightM, limits: 0.1 };
    await api.post(`/api/towers/${tower.id}/sensors`, { ...sensor, from: new Date(0).toISOString() });
  }
  return tower;
}

/** A night as an unfamiliar logger writes it: a title, semicolons, decimal commas, day first, °F; two rows are spoilt. */
function unfamiliarFile() {
  const comma = (number) => number.toFixed(1).replace('.', ',');
  const rows = Array.from({ length: ROWS }, (_, i) => {
    const [day, clock] = new Date(Date.UTC(2025, 10, 5, 20, i * 10)).toISOString().split('T');
    const stamp = `${day.split('-').reverse().join('/')} ${clock.slice(0, 5)}`;
    const values = [20 - i * 0.15, 22 - i * 0.1, 25 - i * 0.04].map((value) => comma(value + (i % 3) * 0.1));
    return BAD_ROWS[i + 3] ?? [stamp, ...values, '12,6'].join(';');
  });
  return ['Quarry logger, night run', 'Stamp;Low arm [°F];T 10 m [°F];T 30 m [°F];Battery', ...rows, ''].join(
    '\r\n',
  );
}

/** An analyst brings a file of a shape nobody has seen, corrects one thing, imports it, and takes it back. */
export async function upload({ step, admin, analyst }) {
  const file = { name: 'night run.csv', mimeType: 'text/csv', buffer: Buffer.from(unfamiliarFile()) };
  let address;

  await step('an analyst sends a file of a shape nobody has seen', async () => {
    await makeQuarry(apiOf(admin));
    await analyst.goto('/readings');
    await analyst.getByRole('link', { name: 'Import a file' }).click();
    await analyst.getByLabel('Tower').selectOption('Quarry mast');
    await look(analyst, '70-choose-file');
    await analyst.getByLabel(/Drop the logger/).setInputFiles(file);
    await analyst.getByRole('heading', { name: 'What was found' }).waitFor();
    address = analyst.url();
    await look(analyst, '71-found');
  });

  await step(
    'sets the one column that was not known, and sees what that gives before it counts',
    async () => {
      await analyst.getByLabel('Sensor of column Low arm [°F]').selectOption('T 2 m');
      await analyst.getByRole('button', { name: 'Import 104 readings' }).waitFor();
      const gives = await analyst.getByRole('table', { name: 'What each sensor would get' }).innerText();
      sure(/T 2 m[^]*−9\.\d+ °C[^]*−6\.667 °C/.test(gives), `20 °F are read as −6.667 °C: ${gives}`);
      await analyst.getByText('the time "05/11/2025 2x:30" cannot be read', { exact: false }).waitFor();
      await analyst.getByText('"--?" is not a number', { exact: false }).waitFor();
      sure(
        (await apiOf(analyst).get('/api/imports')).items.every(({ origin }) => origin !== 'upload'),
        'nothing is in yet',
      );
    },
  );

  await step(
    'imports it once although the button is pressed twice, and downloads what was refused',
    async () => {
      await analyst.reload();
      await analyst.getByRole('button', { name: 'Import 104 readings' }).dblclick();
      await analyst.getByText('new readings').waitFor();
      sure(analyst.url() === address, 'the result stands where the file stood');
      await analyst.getByRole('table', { name: 'Refused rows' }).waitFor();
      await look(analyst, '72-imported');
      const { items } = await apiOf(analyst).get('/api/imports');
      const uploads = items.filter(({ origin }) => origin === 'upload');
      sure(
        uploads.length === 1 && uploads[0].new === 104,
        `one import of 104 readings: ${JSON.stringify(uploads)}`,
      );
      const [download] = await Promise.all([
        analyst.waitForEvent('download'),
        analyst.getByRole('link', { name: 'Download the refused rows' }).click(),
      ]);
      const table = readFileSync(await download.path(), 'utf8');
      for (const said of ['2x:30', '--?', '12', '20']) sure(table.includes(said), `${said} is in ${table}`);
    },
  );

  await step('is told that the same file brings nothing new, and undoes the import', async () => {
    await analyst.getByRole('link', { name: 'Import another file' }).click();
    await analyst.getByLabel(/Drop the logger/).setInputFiles(file);
    await analyst.getByText('This very file was imported before').waitFor();
    await analyst.goto('/readings');
    await look(analyst, '73-readings');
    await analyst.getByRole('link', { name: 'night run.csv (file)' }).click();
    await analyst.getByRole('button', { name: 'Undo this import' }).click();
    await analyst.getByLabel('Reason').fill('The arms were swapped on site');
    await analyst.getByRole('button', { name: 'Undo the import' }).click();
    await analyst.getByText(/^undone/).waitFor();
    await until('its readings are out of force', async () => {
      const [of] = (await apiOf(analyst).get('/api/imports')).items.filter(
        ({ origin }) => origin === 'upload',
      );
      return of.state === 'withdrawn';
    });
    await look(analyst, '74-undone');
  });
}

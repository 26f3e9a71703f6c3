import { look } from '../look.mjs';
import { sure } from '../steps.mjs';
import { until } from '../until.mjs';
import { apiOf, dropFile, loggerLines, pushLines } from '../valley.mjs';

/** A folder is looked into every 10 s. */
const TAKEN_IN_WITHIN_MS = 20_000;
/** What a screen that is open promises. */
const SEEN_WITHIN_MS = 15_000;

/** Readings come in, and the open desk asks the question. */
export async function finding({ step, product, analyst, valley }) {
  await step("a logger's file and a push become a proposal", async () => {
    await analyst.goto('/desk');
    await analyst.getByText('Mill Flats').first().waitFor();
    await analyst.getByText('Nothing waits for a decision.').waitFor();
    await look(analyst, '20-desk-not-known');
    const { header, lines } = loggerLines(Date.now());
    dropFile(product.loggerDir, { header, lines: lines.slice(0, -2) });
    const pushed = await pushLines(product.url, valley.key, { header, lines: lines.slice(-2) });
    sure(pushed.new === 8 && pushed.refused === 0, `8 pushed readings are new: ${JSON.stringify(pushed)}`);
    const open = async () => (await apiOf(analyst).get('/api/proposals?state=open')).items;
    await until(
      'a burn ban is proposed',
      async () => (await open()).some(({ kind }) => kind === 'burnBan'),
      TAKEN_IN_WITHIN_MS,
    );
  });

  await step('the open desk shows it without reloading', async () => {
    await analyst.getByText('Burn ban for Mill Flats?').waitFor({ timeout: SEEN_WITHIN_MS });
    await look(analyst, '21-desk');
  });
}

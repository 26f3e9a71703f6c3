/**
 * One journey through the built product, from a logger's file to a resident's inbox and phone, by the people who make
 * it. Ends with "N passed, N failed". JOURNEY_SHOTS keeps a picture of every page looked at; after a failure what each
 * window shows is kept in any case.
 */
import { mkdtempSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { complaints } from './faults.mjs';
import { journey } from './journey.mjs';
import { keepPicture } from './look.mjs';
import { openBrowser } from './people.mjs';
import { startProduct } from './product.mjs';
import { stepCounter, sure } from './steps.mjs';

let product;
let browser;

/** Keeps what every window shows, and says what went wrong besides. */
async function keepFailure() {
  const folder = process.env.JOURNEY_SHOTS ?? mkdtempSync(path.join(os.tmpdir(), 'lidwatch-journey-shots-'));
  for (const [who, page] of Object.entries(browser?.people ?? {}))
    await keepPicture(page, `failed-${who}`, folder).catch((error) => console.error(error.message));
  console.error(`Pictures of every window: ${folder}`);
  console.error([...(browser?.faults ?? []), ...complaints(product?.said() ?? '')].join('\n'));
}

const { counts, step } = stepCounter(keepFailure);
try {
  await step('the empty product starts', async () => {
    product = await startProduct();
    browser = await openBrowser(product.url);
  });
  if (browser) {
    await journey({ step, product, ...browser.people });
    await step('console, network and server log are clean', () => {
      sure(browser.faults.length === 0, `nothing went wrong in a window:\n${browser.faults.join('\n')}`);
      const said = complaints(product.said());
      sure(said.length === 0, `the service complained of nothing:\n${said.join('\n')}`);
    });
  }
} finally {
  await browser?.close();
  await product?.stop();
}
process.exitCode = counts.failed === 0 ? 0 : 1;
console.log(`${counts.passed} passed, ${counts.failed} failed`);

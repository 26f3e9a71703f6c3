/**
 * One journey through the built product, from a logger's file to a resident's inbox and phone, by the people who make
 * it. Ends with "N passed, N failed". JOURNEY_SHOTS keeps a picture of every page looked at.
 */
import { journey } from './journey.mjs';
import { openBrowser } from './people.mjs';
import { startProduct } from './product.mjs';
import { stepCounter, sure } from './steps.mjs';

const { counts, step } = stepCounter();
let product;
let window;
try {
  await step('the empty product starts', async () => {
    product = await startProduct();
    window = await openBrowser(product.url);
  });
  if (product && window) {
    await journey({ step, product, window });
    await step('console, network and server log are clean', () => {
      sure(window.faults.length === 0, `nothing went wrong in a window:\n${window.faults.join('\n')}`);
      const errors = product.said().match(/^.*"level":(50|60).*$/gm) ?? [];
      sure(errors.length === 0, `the server logged no error:\n${errors.join('\n')}`);
    });
  }
} finally {
  await window?.close();
  await product?.stop();
}
process.exitCode = counts.failed === 0 ? 0 : 1;
console.log(`${counts.passed} passed, ${counts.failed} failed`);

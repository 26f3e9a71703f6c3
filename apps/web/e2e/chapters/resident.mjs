import { EMAIL, inboxOf, PHONE } from '../inbox.mjs';
import { look } from '../look.mjs';
import { until } from '../until.mjs';

/** Somebody who lives there reads the page, subscribes, and confirms both addresses. */
export async function resident({ step, product, resident: page }) {
  const inbox = inboxOf(product.inbox);

  await step('a resident reads "not known" in both languages', async () => {
    await page.goto('/d/mill-flats');
    await page.getByRole('heading', { name: /We cannot see the air in Mill Flats/ }).waitFor();
    await look(page, '10-public-not-known');
    await page.getByRole('link', { name: 'Español' }).click();
    await page.getByRole('heading', { name: /no podemos ver el aire/ }).waitFor();
    await look(page, '11-public-not-known-es');
  });

  await step('the resident subscribes and confirms by the links in mail and text', async () => {
    await page.goto('/subscribe?district=mill-flats');
    await page.getByLabel('E-mail').fill(EMAIL);
    await page.getByLabel('Mobile phone').fill(PHONE);
    for (const name of [/Burn bans/, /Mill Flats/]) await page.getByLabel(name).check();
    await look(page, '12-subscribe');
    await page.getByRole('button', { name: 'Send me notices' }).click();
    await page.getByText('One more step').waitFor();
    await look(page, '13-one-more-step');
    const mail = await until('the confirmation mail', async () => (await inbox.mails())[0]);
    const text = await until('the confirmation text', async () => (await inbox.texts())[0]);
    for (const words of [mail.text, text.body]) {
      await page.goto(/https?:\/\/\S*\/s\/confirm\/\S+/.exec(words)[0]);
      await page.getByRole('button', { name: 'Yes, send me notices' }).click();
      await page.getByText('From now on we write to you').waitFor();
    }
    await look(page, '14-confirmed');
    await page.getByRole('link', { name: 'See or change what I get' }).click();
    await page.getByRole('heading', { name: 'My notices' }).waitFor();
    await page.getByText('We reach you at').waitFor();
    await look(page, '15-my-notices');
  });
}

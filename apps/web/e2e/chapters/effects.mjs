import { inboxOf } from '../inbox.mjs';
import { look } from '../look.mjs';
import { sure } from '../steps.mjs';
import { until } from '../until.mjs';
import { apiOf } from '../valley.mjs';
import { servedText } from '../served.mjs';

/** The notice arrives, and every page says so. */
export async function effects(trip) {
  const { step, product, analyst, officer, resident } = trip;
  const inbox = inboxOf(product.inbox);

  await step('one mail and one text arrive, and the carrier’s receipt is in the log', async () => {
    const mails = async () =>
      (await inbox.mails()).filter(({ subject }) => subject.startsWith('Burn ban in Mill Flats'));
    const texts = async () =>
      (await inbox.texts()).filter(({ body }) => body.includes('burn ban in Mill Flats'));
    await until('the notice by mail', async () => (await mails()).length > 0);
    await until('the notice by text', async () => (await texts()).length > 0);
    await until('both are done', async () => {
      const { delivery } = await apiOf(officer).get(`/api${trip.noticePath}`);
      const done = (channel, state) =>
        delivery.some((each) => each.channel === channel && each.state === state && each.count === 1);
      return delivery.length === 2 && done('email', 'accepted') && done('sms', 'delivered');
    });
    sure((await mails()).length === 1, 'the mail came once');
    sure((await texts()).length === 1, 'the text came once');
    await officer.getByText('delivered, by the carrier’s receipt').first().waitFor();
    await look(officer, '40-notice');
  });

  await step('the log lists it, its detail opens, and the history draws it', async () => {
    await analyst.getByRole('link', { name: 'Notices' }).click();
    const listed = analyst.getByRole('link', { name: /MF-\d\d-001/ });
    await listed.waitFor();
    await look(analyst, '41-notice-log');
    await listed.click();
    await analyst.getByRole('heading', { name: /Burn ban, Mill Flats/ }).waitFor();
    await look(analyst, '42-notice-detail');
    await analyst.getByRole('link', { name: 'History' }).click();
    await analyst.getByText(/1 notice in this time/).waitFor();
    await look(analyst, '43-history');
  });

  await step('the public page says so in its served HTML and in the browser', async () => {
    const served = await servedText(`${product.url}/d/mill-flats`);
    sure(served.includes('Burn ban in Mill Flats'), 'the served page says "Burn ban in Mill Flats"');
    sure(served.includes('Carbon monoxide kills'), 'the served page warns of carbon monoxide');
    const spanish = await servedText(`${product.url}/d/mill-flats?lang=es`);
    sure(
      spanish.includes('Prohibido quemar en Mill Flats'),
      `the Spanish page says so: ${spanish.slice(0, 300)}`,
    );
    await resident.goto('/d/mill-flats');
    await resident.getByRole('heading', { name: 'Burn ban in Mill Flats' }).waitFor();
    await look(resident, '44-public-ban');
    await resident.goto('/');
    await resident.getByText('Burn ban').first().waitFor();
    await look(resident, '45-public-list');
  });
}

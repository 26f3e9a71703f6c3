import { inboxOf } from '../inbox.mjs';
import { look } from '../look.mjs';
import { servedText } from '../served.mjs';
import { until } from '../until.mjs';
import { PASSWORD } from '../valley.mjs';

/** The officer ends it, and everybody is told. */
export async function ending({ step, product, officer, resident }) {
  const inbox = inboxOf(product.inbox);

  await step('the officer ends it', async () => {
    await officer.getByRole('link', { name: 'Decisions' }).click();
    await officer.getByRole('button', { name: /^End MF-\d\d-001 in Mill Flats/ }).click();
    await officer.getByLabel('Reason').fill('The lid has broken.');
    await officer.getByLabel('Your password, again').fill(PASSWORD);
    await look(officer, '50-end-dialog');
    await officer.getByRole('button', { name: 'End it now' }).click();
    await officer.getByText('No restriction in force').first().waitFor();
  });

  await step('the public page follows, and mail and text say so', async () => {
    await until('the public page says no restriction', async () =>
      (await servedText(`${product.url}/d/mill-flats`)).includes('No restriction in force in Mill Flats'),
    );
    await resident.goto('/d/mill-flats');
    await resident.getByRole('heading', { name: /No restriction in force/ }).waitFor();
    await look(resident, '51-public-no-restriction');
    await until('the mail that it has ended', async () =>
      (await inbox.mails()).some(({ subject }) => subject.includes('has ended')),
    );
    // The confirmation, the beginning and the end.
    await until('the text that it has ended', async () => (await inbox.texts()).length === 3);
  });
}

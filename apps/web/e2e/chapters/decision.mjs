import { look } from '../look.mjs';
import { sure } from '../steps.mjs';
import { apiOf, PASSWORD } from '../valley.mjs';

const SENTENCE = 'Calm and clear until morning.';
const PROPOSAL = /\/api\/proposals\/\d+$/;

/** The analyst confirms, one officer issues by a double click, and the other is told. */
export async function decision(trip) {
  const { step, analyst, officer, second } = trip;

  await step('the analyst reads the evidence and confirms', async () => {
    await analyst.getByRole('link', { name: 'Read and decide: Burn ban for Mill Flats?' }).click();
    await analyst.getByText(/Inversion within the tower at least 2 °C for 1 h/).waitFor();
    await analyst.getByLabel('A sentence for the officer').fill(SENTENCE);
    await look(analyst, '30-proposal');
    await analyst.getByRole('button', { name: 'Confirm for the officer' }).click();
    await analyst
      .getByText(/Confirmed by Tomas Reyle at/)
      .first()
      .waitFor();
    await look(analyst, '31-confirmed');
  });

  await step('the officer reads the message on the phone', async () => {
    await officer.goto('/officer');
    const waiting = officer.getByRole('link', { name: /Burn ban for Mill Flats/ });
    await waiting.waitFor();
    await look(officer, '32-decisions');
    await waiting.click();
    await officer.getByText(SENTENCE).first().waitFor();
    await officer
      .getByText(/burn ban in Mill Flats until/)
      .first()
      .waitFor();
    await look(officer, '33-notice-to-issue');
  });

  await step('both officers go to issue it; the double click of the first does it once', async () => {
    await second.goto(new URL(officer.url()).pathname);
    await askToIssue(second);
    // The second officer's window stays as it is now, so that both decide on the same.
    const before = await apiOf(second).get(`/api${new URL(second.url()).pathname}`);
    await second.route(PROPOSAL, (route) => route.fulfill({ json: before }));
    await askToIssue(officer);
    await look(officer, '34-issue-dialog');
    await officer.getByRole('button', { name: 'Issue burn ban now' }).dblclick();
    await officer.waitForURL('**/notices/*');
    await officer.getByRole('heading', { name: /Burn ban, Mill Flats/ }).waitFor();
    trip.noticePath = new URL(officer.url()).pathname;
  });

  await step('the second officer is told what the first did, and nothing is done twice', async () => {
    await second.unroute(PROPOSAL);
    await second.getByRole('button', { name: 'Issue burn ban now' }).click();
    await second
      .getByText(/issued by Marta Quill at/i)
      .first()
      .waitFor();
    await look(second, '35-already-issued');
    const { total } = await apiOf(second).get('/api/notices');
    sure(total === 1, `there is one notice, not ${total}`);
  });
}

async function askToIssue(page) {
  await page.getByRole('button', { name: 'Issue burn ban…' }).click();
  await page.getByLabel('Your password, again').fill(PASSWORD);
}

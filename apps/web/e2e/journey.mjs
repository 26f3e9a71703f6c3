import { keepPicture, look } from './people.mjs';
import { sure } from './steps.mjs';
import { until } from './until.mjs';
import { apiOf, dropFile, loggerLines, PASSWORD, pushLines, putRuleInForce, setUpValley } from './valley.mjs';

const EMAIL = 'ada.reed@post.example';
const PHONE = '+12085550177';
const seenBy = (html) => html.replace(/<script[\s\S]*?<\/script>/g, '').replace(/<[^>]*>/g, ' ');

/** Reads the local services' JSON. */
const inboxOf = (product) => async (url) => (await fetch(product.inbox + url)).json();

async function acceptInvitation(page, url) {
  await page.goto(url);
  await page.getByLabel('Password', { exact: false }).first().fill(PASSWORD);
  await page.getByLabel('Password again').fill(PASSWORD);
  await page.locator('button[type=submit]').click();
  await page.waitForURL((at) => !at.pathname.startsWith('/welcome'));
}

/** The whole journey; each step builds on the ones before. */
export async function journey({ step, product, window }) {
  const inbox = inboxOf(product);
  const admin = await window.person();
  const analyst = await window.person();
  const officer = await window.person({ phone: true });
  const second = await window.person();
  const resident = await window.person({ phone: true });
  let valley;
  let noticeUrl;

  await step('the first administrator comes in by the printed link', async () => {
    await admin.goto(product.firstLink);
    await admin.getByLabel('Your name').fill('Ines Calder');
    await admin.getByLabel('E-mail').fill('ines@pellworth.example');
    await admin.getByLabel('Password', { exact: false }).first().fill(PASSWORD);
    await admin.getByLabel('Password again').fill(PASSWORD);
    await look(admin, '01-first-administrator');
    await admin.getByRole('button', { name: 'Become the administrator' }).click();
    await admin.waitForURL('**/admin');
    await admin.getByText('Invite somebody').waitFor();
    await look(admin, '02-administration');
  });

  await step('tower, district, people and rule are made through the API', async () => {
    const api = apiOf(admin);
    valley = await setUpValley(api);
    const invite = (name, role, districtIds = []) =>
      api.post('/api/users', {
        name,
        role,
        districtIds,
        email: `${name.split(' ')[0].toLowerCase()}@pellworth.example`,
      });
    const made = await invite('Tomas Reyle', 'analyst');
    await acceptInvitation(analyst, made.invitationUrl);
    await acceptInvitation(
      officer,
      (await invite('Marta Quill', 'officer', [valley.district.id])).invitationUrl,
    );
    await acceptInvitation(
      second,
      (await invite('Joss Fennimore', 'officer', [valley.district.id])).invitationUrl,
    );
    await putRuleInForce(apiOf(analyst), valley.district.id);
  });

  await step('a resident reads "not known", subscribes, and confirms by mail and text', async () => {
    await resident.goto('/d/mill-flats');
    await resident.getByRole('heading', { name: /We cannot see the air in Mill Flats/ }).waitFor();
    await look(resident, '03-public-not-known');
    await resident.getByRole('link', { name: 'Español' }).click();
    await resident.getByRole('heading', { name: /no podemos ver el aire/ }).waitFor();
    await resident.goto('/subscribe?district=mill-flats');
    await resident.getByLabel('E-mail').fill(EMAIL);
    await resident.getByLabel('Mobile phone').fill(PHONE);
    for (const name of [/Burn bans/, /Mill Flats/]) await resident.getByLabel(name).check();
    await look(resident, '04-subscribe');
    await resident.getByRole('button', { name: 'Send me notices' }).click();
    await resident.getByText('One more step').waitFor();
    const mail = await until(
      'the confirmation mail',
      async () => (await inbox(`/api/mail?to=${EMAIL}`)).items[0],
    );
    const text = await until(
      'the confirmation text',
      async () => (await inbox(`/api/sms?to=${encodeURIComponent(PHONE)}`)).items[0],
    );
    for (const words of [mail.text, text.body]) {
      await resident.goto(/https?:\/\/\S*\/s\/confirm\/\S+/.exec(words)[0]);
      await resident.getByRole('button', { name: 'Yes, send me notices' }).click();
      await resident.getByText('From now on we write to you').waitFor();
    }
    await look(resident, '05-confirmed');
  });

  await step("a logger's file and a push become a proposal on the open desk", async () => {
    await analyst.goto('/desk');
    await analyst.getByText('Mill Flats').first().waitFor();
    const { header, lines } = loggerLines(Date.now());
    dropFile(product.loggerDir, { header, lines: lines.slice(0, -2) });
    const pushed = await pushLines(product.url, valley.key, { header, lines: lines.slice(-2) });
    sure(pushed.new === 8, `the push took 8 readings, not ${JSON.stringify(pushed)}`);
    await analyst.getByText('Burn ban for Mill Flats?').waitFor({ timeout: 60_000 });
    await look(analyst, '06-desk');
  });

  await step('the analyst reads the evidence and confirms', async () => {
    await analyst.getByRole('link', { name: /Read and decide/ }).click();
    await analyst.getByText(/Inversion within the tower at least 2 °C for 1 h/).waitFor();
    await analyst.getByLabel('A sentence for the officer').fill('Calm and clear until morning.');
    await look(analyst, '07-proposal');
    await second.goto(new URL(analyst.url()).pathname);
    await analyst.getByRole('button', { name: 'Confirm for the officer' }).click();
    await analyst
      .getByText(/Confirmed by Tomas Reyle at/)
      .first()
      .waitFor();
  });

  await step(
    'the officer reads the message on the phone and issues the ban once, by a double click',
    async () => {
      await officer.goto('/officer');
      await officer.getByRole('link', { name: /Read and decide/ }).click();
      await officer.getByText('Calm and clear until morning.').first().waitFor();
      await officer
        .getByText(/burn ban in Mill Flats until/)
        .first()
        .waitFor();
      await look(officer, '08-officer');
      await second.reload();
      await second.getByRole('button', { name: 'Issue burn ban…' }).click();
      await second.getByLabel('Your password, again').fill(PASSWORD);
      await officer.getByRole('button', { name: 'Issue burn ban…' }).click();
      await officer.getByLabel('Your password, again').fill(PASSWORD);
      await keepPicture(officer, '09-issue-dialog');
      await officer.getByRole('button', { name: 'Issue burn ban now' }).dblclick();
      await officer.waitForURL('**/notices/*');
      noticeUrl = new URL(officer.url()).pathname;
      await officer.getByRole('heading', { name: /Burn ban, Mill Flats/ }).waitFor();
    },
  );

  await step('the second officer is told what the first did', async () => {
    await second.getByRole('button', { name: 'Issue burn ban now' }).click();
    await second
      .getByText(/Already issued by Marta Quill/)
      .first()
      .waitFor();
    await keepPicture(second, '10-already-done');
  });

  await step('one mail and one text arrive, and the log shows the receipt', async () => {
    const mails = await until('the notice by mail', async () => {
      const { items } = await inbox(`/api/mail?to=${EMAIL}`);
      return items.some(({ subject }) => subject.startsWith('Burn ban in Mill Flats')) && items;
    });
    sure(mails.length === 2, `two mails came in all, not ${mails.length}`);
    const { items: texts } = await inbox(`/api/sms?to=${encodeURIComponent(PHONE)}`);
    sure(
      texts.filter(({ body }) => body.includes('burn ban in Mill Flats')).length === 1,
      'one text says so',
    );
    await until('the receipt of the text', async () => {
      const { delivery } = await apiOf(officer).get(`/api${noticeUrl}`);
      return delivery.some(({ channel, state }) => channel === 'sms' && state === 'delivered');
    });
    await officer.reload();
    await officer
      .getByText(/delivered, by the carrier/)
      .first()
      .waitFor();
    await look(officer, '11-notice');
    await analyst.goto('/notices');
    await analyst
      .getByRole('link', { name: /MF-\d\d-001/ })
      .first()
      .waitFor();
    await look(analyst, '12-notice-log');
    await analyst.goto('/history');
    await analyst.getByText(/Strength of the surface inversion, Mill Flats/).waitFor();
    await look(analyst, '13-history');
  });

  await step('the public page says so in its served HTML and in the browser', async () => {
    const served = seenBy(await (await fetch(`${product.url}/d/mill-flats`)).text());
    sure(served.includes('Burn ban in Mill Flats'), 'the served page says "Burn ban in Mill Flats"');
    sure(served.includes('Carbon monoxide kills'), 'the served page warns of carbon monoxide');
    await resident.goto('/d/mill-flats');
    await resident.getByRole('heading', { name: 'Burn ban in Mill Flats' }).waitFor();
    await look(resident, '14-public-ban');
    await resident.goto('/');
    await resident.getByText('Burn ban').first().waitFor();
    await look(resident, '15-public-list');
  });

  await step('the officer ends it, and the public page follows', async () => {
    await officer.goto('/officer');
    await officer.getByRole('button', { name: /End/ }).first().click();
    await officer.getByLabel('Reason').fill('The lid has broken.');
    await officer.getByLabel('Your password, again').fill(PASSWORD);
    await officer.getByRole('button', { name: 'End it now' }).click();
    await until('the public page says no restriction', async () =>
      seenBy(await (await fetch(`${product.url}/d/mill-flats`)).text()).includes(
        'No restriction in force in Mill Flats',
      ),
    );
    await resident.goto('/d/mill-flats');
    await resident.getByRole('heading', { name: /No restriction in force/ }).waitFor();
    await look(resident, '16-public-no-restriction');
    await until('the mail that it has ended', async () =>
      (await inbox(`/api/mail?to=${EMAIL}`)).items.some(({ subject }) => subject.includes('has ended')),
    );
  });
}

import { look } from '../look.mjs';
import { apiOf, PASSWORD, putRuleInForce, setUpValley } from '../valley.mjs';

const ADMIN_PAGES = [
  ['/admin/towers', 'Mill mast', '03-towers'],
  ['/admin/towers/1', 'T 30 m', '04-tower'],
  ['/admin/districts', 'Mill Flats', '05-districts'],
  ['/rules', 'For this season.', '06-rules'],
];

/** The first administrator comes, sets the valley up, and the others follow their invitations. */
export async function arrival(trip) {
  const { step, product, admin, analyst, officer, second } = trip;

  await step('the first administrator comes in by the printed link', async () => {
    await admin.goto(product.firstLink);
    await admin.getByLabel('Your name').fill('Ines Calder');
    await admin.getByLabel('E-mail').fill('ines@pellworth.example');
    await choosePassword(admin);
    await look(admin, '01-first-administrator');
    await admin.getByRole('button', { name: 'Become the administrator' }).click();
    await admin.waitForURL('**/admin');
    await admin.getByText('Invite somebody').waitFor();
    await look(admin, '02-administration');
  });

  await step('tower and district are made through the API, and people follow their invitations', async () => {
    const api = apiOf(admin);
    trip.valley = await setUpValley(api, product.loggerDir);
    const districtIds = [trip.valley.district.id];
    const invite = async (name, role, ids = []) => {
      const email = `${name.split(' ')[0].toLowerCase()}@pellworth.example`;
      return (await api.post('/api/users', { name, role, districtIds: ids, email })).invitationUrl;
    };
    await accept(analyst, await invite('Tomas Reyle', 'analyst'));
    await accept(officer, await invite('Marta Quill', 'officer', districtIds), '07-invitation');
    await accept(second, await invite('Joss Fennimore', 'officer', districtIds));
  });

  await step("the analyst puts the district's rule in force, and the administrator sees it all", async () => {
    await putRuleInForce(apiOf(analyst), trip.valley.district.id);
    for (const [path, shows, name] of ADMIN_PAGES) {
      await admin.goto(path);
      await admin.getByText(shows).first().waitFor();
      await look(admin, name);
    }
  });

  await step('an officer signs out and in again', async () => {
    await apiOf(second).post('/api/auth/sign-out');
    await second.goto('/officer');
    await second.waitForURL('**/sign-in*');
    await second.getByLabel('E-mail').fill('joss@pellworth.example');
    await look(second, '08-sign-in');
    await second.getByLabel('Password').fill(PASSWORD);
    await second.getByRole('button', { name: 'Sign in' }).click();
    await second.getByRole('heading', { name: 'Decisions' }).waitFor();
  });
}

async function choosePassword(page) {
  await page.getByLabel('Password', { exact: false }).first().fill(PASSWORD);
  await page.getByLabel('Password again').fill(PASSWORD);
}

async function accept(page, url, picture) {
  await page.goto(url);
  await choosePassword(page);
  if (picture) await look(page, picture);
  await page.getByRole('button', { name: 'Set password and sign in' }).click();
  await page.waitForURL((at) => !at.pathname.startsWith('/welcome'));
}

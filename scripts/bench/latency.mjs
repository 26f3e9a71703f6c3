/**
 * Figure `latency`, on the running product: from the push of the reading that meets a rule to the open proposal, and
 * from the officer's issuing to the arrival of the first mail at the mail server. Each round has a tower and a
 * district of its own.
 */
import { performance } from 'node:perf_hooks';
import { startProduct } from '../../apps/web/e2e/product.mjs';
import { until } from '../../apps/web/e2e/until.mjs';
import { makePlace, push, readings } from './latency/place.mjs';
import { sessionOf } from './latency/session.mjs';

const ROUNDS = { small: 5, full: 15 };
const PASSWORD = 'a quiet winter morning';

const spread = (values) => {
  const sorted = values.toSorted((a, b) => a - b);
  return { median: sorted[Math.floor(sorted.length / 2)], low: sorted[0], high: sorted.at(-1) };
};

async function accept(baseUrl, link) {
  const session = sessionOf(baseUrl);
  await session.post('/api/auth/invitations/accept', { token: link.split('/').at(-1), password: PASSWORD });
  return session;
}

/** One subscriber by mail, confirmed by the link they were sent. */
async function subscribe({ url, inbox }, slug) {
  const email = `reader-of-${slug}@post.example`;
  const session = sessionOf(url);
  await session.post('/api/public/subscriptions', {
    email,
    lang: 'en',
    districtSlugs: [slug],
    kinds: ['advisory'],
  });
  const mails = async () => (await (await fetch(`${inbox}/api/mail?to=${email}`)).json()).items;
  const { text } = await until('the confirmation mail', async () => (await mails())[0]);
  await session.post('/api/public/subscriptions/confirm', { token: /\/s\/confirm\/(\S+)/.exec(text)[1] });
  return mails;
}

/** Measures `readingToProposalMs` and `issueToFirstMailMs`, medians of several rounds. */
export async function run({ size }) {
  const product = await startProduct();
  try {
    const { url, firstLink } = product;
    const admin = sessionOf(url);
    const first = {
      token: firstLink.split('/').at(-1),
      name: 'Ines Calder',
      email: 'ines@pellworth.example',
    };
    await admin.post('/api/auth/first-administrator', { ...first, password: PASSWORD });
    const invite = async (role, districtIds) => {
      const person = {
        role,
        name: `Bench ${role}`,
        email: `${role}${districtIds.join('')}@pellworth.example`,
      };
      return accept(url, (await admin.post('/api/users', { ...person, districtIds })).invitationUrl);
    };
    const analyst = await invite('analyst', []);
    const toProposal = [];
    const toMail = [];
    for (let n = 1; n <= ROUNDS[size]; n += 1) {
      const { tower, district, key } = await makePlace({ admin, analyst }, n);
      const officer = await invite('officer', [district.id]);
      const mails = await subscribe(product, district.slug);
      const { before, inverted } = readings(Date.now());
      await push(url, key, before);
      await until(
        'earlier blocks',
        async () => (await admin.get(`/api/towers/${tower.id}/pipeline`)).pending === 0,
      );
      const pushedAt = performance.now();
      await push(url, key, inverted);
      const open = async () => (await analyst.get(`/api/proposals?districtId=${district.id}`)).items[0];
      let card = await open();
      while (!card && performance.now() - pushedAt < 30_000) card = await open();
      if (!card) throw new Error('No proposal came within 30 s.');
      toProposal.push(performance.now() - pushedAt);
      await analyst.post(`/api/proposals/${card.id}/confirm`, {
        note: 'For the bench.',
        version: card.version,
      });
      const preview = await officer.post(`/api/proposals/${card.id}/preview`);
      const issuedAt = Date.now();
      await officer.post(`/api/proposals/${card.id}/issue`, {
        ...{ previewHash: preview.hash, version: card.version + 1, expiresAt: preview.expiresAt },
        requestKey: `bench-round-${n}`,
      });
      const sent = await until('the notice', async () =>
        (await mails()).find(({ subject }) => subject.startsWith('Advisory')),
      );
      toMail.push(new Date(sent.at).getTime() - issuedAt);
    }
    return { readingToProposalMs: spread(toProposal), issueToFirstMailMs: spread(toMail) };
  } finally {
    await product.stop();
  }
}

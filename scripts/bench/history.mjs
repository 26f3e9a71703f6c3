/**
 * Figure `history`, on the running product: years of towers in its store, and how long the desk, the chart and the
 * other lists take. A fortnight of one tower is pushed and worked out by the product itself; the same rows, moved in
 * time and to the other towers, are written straight into this bench's own store.
 */
import { statSync } from 'node:fs';
import path from 'node:path';
import { performance } from 'node:perf_hooks';
import { startProduct } from '../../apps/web/e2e/product.mjs';
import { until } from '../../apps/web/e2e/until.mjs';
import { asked, measure } from './history/asked.mjs';
import { fillStore } from './history/fill.mjs';
import { makeDistricts } from './history/districts.mjs';
import { FORTNIGHT_S, fortnight } from './history/fortnight.mjs';
import { push } from './latency/place.mjs';
import { sessionOf } from './latency/session.mjs';

const SIZES = { small: { years: 1, towers: 4, rounds: 40 }, full: { years: 5, towers: 20, rounds: 100 } };
const PASSWORD = 'a quiet winter morning';
const YEAR_S = 365.25 * 86_400;

/** The first administrator and an analyst, signed in. */
async function signIn({ url, firstLink }) {
  const admin = sessionOf(url);
  const first = { name: 'Ines Calder', email: 'ines@pellworth.example', password: PASSWORD };
  await admin.post('/api/auth/first-administrator', { token: firstLink.split('/').at(-1), ...first });
  const person = {
    role: 'analyst',
    name: 'Bench analyst',
    email: 'analyst@pellworth.example',
    districtIds: [],
  };
  const { invitationUrl } = await admin.post('/api/users', person);
  const analyst = sessionOf(url);
  const token = invitationUrl.split('/').at(-1);
  await analyst.post('/api/auth/invitations/accept', { token, password: PASSWORD });
  return { admin, analyst };
}

/** The product again on the same folder, and the analyst signed in there. */
async function startAgain(folder) {
  const product = await startProduct({ folder });
  const analyst = sessionOf(product.url);
  await analyst.post('/api/auth/sign-in', { email: 'analyst@pellworth.example', password: PASSWORD });
  return { product, analyst };
}

/** Measures the store's size and the percentiles of each kind of request. */
export async function run({ size }) {
  const { years, towers, rounds } = SIZES[size];
  let product = await startProduct();
  try {
    const { admin, analyst } = await signIn(product);
    const made = await makeDistricts({ admin, analyst }, towers);
    for (const body of fortnight(Date.now())) await push(product.url, made[0].key, body);
    const done = async () =>
      (await admin.get(`/api/towers/${made[0].towerId}/pipeline`)).pending === 0 &&
      (await analyst.get('/api/desk')).districts[0].fresh;
    await until('the fortnight is worked out', done, 180_000);
    const { folder } = product;
    await product.stop({ keep: true });

    const file = path.join(folder, 'data/lidwatch.sqlite');
    const filledFrom = performance.now();
    const readings = await fillStore(file, made, Math.round((years * YEAR_S) / FORTNIGHT_S));
    const fillSeconds = (performance.now() - filledFrom) / 1000;

    const again = await startAgain(folder);
    product = again.product;
    const figures = {};
    for (const [name, urls] of Object.entries(asked(made, Date.now() / 1000, years))) {
      const { p50, p95 } = await measure(again.analyst, urls, rounds);
      Object.assign(figures, { [`${name}P50Ms`]: p50, [`${name}P95Ms`]: p95 });
    }
    return { readings, databaseMb: statSync(file).size / 1e6, fillSeconds, ...figures };
  } finally {
    await product.stop();
  }
}

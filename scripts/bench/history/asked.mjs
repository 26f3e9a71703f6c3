import { performance } from 'node:perf_hooks';

const DAY_S = 86_400;
const iso = (t) => new Date(t * 1000).toISOString();

/** What the screens ask for, by the figure it counts to. */
export function asked(places, now, years) {
  const span = (days, ago = 0) => `from=${iso(now - (ago + days) * DAY_S)}&to=${iso(now - ago * DAY_S)}`;
  const day = (t) => iso(t).slice(0, 10);
  const days = (length, ago) => `from=${day(now - (ago + length) * DAY_S)}&to=${day(now - ago * DAY_S)}`;
  const each = (urlOf) => places.map((place, i) => urlOf(place, (i * 37) % (years * 365 - 400 || 1)));
  return {
    desk: ['/api/desk'],
    chart: [
      ...each(({ districtId }) => `/api/districts/${districtId}/history?${span(2)}`),
      ...each(({ districtId }, ago) => `/api/districts/${districtId}/history?${span(14, ago)}`),
      ...each(({ districtId }, ago) => `/api/districts/${districtId}/history?${span(120, ago)}`),
      ...each(({ districtId }, ago) => `/api/districts/${districtId}/history?${span(364, ago)}`),
    ],
    profile: each(({ towerId }) => `/api/towers/${towerId}/profile`),
    notices: ['/api/notices?page=1', '/api/proposals'],
    calendar: each(({ towerId }, ago) => `/api/towers/${towerId}/calendar?${days(90, ago)}`),
    flags: each(({ towerId }, ago) => `/api/towers/${towerId}/flags?${span(30, ago)}`),
    raw: each(({ towerId }, ago) => `/api/towers/${towerId}/raw?${span(30, ago)}`),
  };
}

/** The 50th and 95th percentile of so many requests, one after the other, each of the addresses in turn, ms. */
export async function measure(session, urls, rounds) {
  const times = [];
  for (let i = 0; i < rounds; i += 1) {
    const from = performance.now();
    await session.get(urls[i % urls.length]);
    times.push(performance.now() - from);
  }
  const sorted = times.toSorted((a, b) => a - b);
  const at = (share) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))];
  return { p50: at(0.5), p95: at(0.95) };
}

import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** The password of everybody on the journey. */
export const PASSWORD = 'a quiet winter morning';
/** The tower's folder below the loggers' folder. */
const FOLDER = 'mill-mast';
const HEIGHTS_M = [2, 10, 30, 60];
const INTERVAL_S = 600;

/** A condition on the strength the mast shows, held for an hour. */
const strength = (op, value) => ({ measure: 'strengthWithinTowerC', op, value, heldMinutes: 60 });
const sure = { measure: 'inversionSure', op: '=', value: true };

/** An advisory from 1 °C, a burn ban from 2 °C, each with its end. */
const RULE = {
  advisory: { begin: { all: [strength('>=', 1), sure] }, end: strength('<', 0.5), longestValidityHours: 24 },
  burnBan: { begin: { all: [strength('>=', 2), sure] }, end: strength('<', 1), longestValidityHours: 48 },
};

/** The API through a signed-in window's session; anything but success is thrown with what was said. */
export function apiOf(page) {
  const send = async (method, url, data) => {
    const answer = await page.request.fetch(url, { method, data });
    const text = await answer.text();
    if (!answer.ok()) throw new Error(`${method} ${url} answered ${answer.status()}: ${text}`);
    return text ? JSON.parse(text) : undefined;
  };
  return {
    get: (url) => send('GET', url),
    post: (url, data = {}) => send('POST', url, data),
    put: (url, data) => send('PUT', url, data),
  };
}

/** As the administrator: office, tower with its sensors, folder source and key, and the district it speaks for. */
export async function setUpValley(api, loggerDir) {
  mkdirSync(path.join(loggerDir, FOLDER), { recursive: true });
  await api.put('/api/office', { name: 'Pellworth Clean Air Office', phone: '208 555 0140' });
  const place = { latitude: 44.05, longitude: -112.95, elevationM: 1150 };
  const logger = {
    intervalMinutes: INTERVAL_S / 60,
    blockMinutes: INTERVAL_S / 60,
    clock: 'UTC',
    stamp: 'end',
  };
  const tower = await api.post('/api/towers', { name: 'Mill mast', ...place, ...logger });
  for (const heightM of HEIGHTS_M) {
    const from = new Date(0).toISOString();
    const sensor = {
      name: `T ${heightM} m`,
      quantity: 'air temperature',
      unit: '°C',
      heightM,
      limits: 0.1,
      from,
    };
    await api.post(`/api/towers/${tower.id}/sensors`, sensor);
  }
  const source = { kind: 'folder', path: FOLDER, mapping: { timeColumn: 'time' }, intervalSeconds: 10 };
  await api.post(`/api/towers/${tower.id}/sources`, source);
  const { key } = await api.post(`/api/towers/${tower.id}/keys`, { name: 'journey' });
  const district = await api.post('/api/districts', {
    ...{ name: 'Mill Flats', timeZone: 'America/Denver', ...place, ordinanceRef: '8.12' },
    ...{ towers: [{ towerId: tower.id, mayBegin: true, mayEnd: true }] },
  });
  return { tower, district, key };
}

/** As the analyst: the district's rule, drafted and put in force. */
export async function putRuleInForce(api, districtId) {
  const { id } = await api.post(`/api/districts/${districtId}/rules`, {
    body: RULE,
    note: 'For this season.',
  });
  await api.post(`/api/rules/${id}/put-in-force`);
}

/** Lines of a logger from four hours ago to now: at first mixed, then an inversion that grows to 5 °C and stays. */
export function loggerLines(nowMs) {
  const last = Math.floor(nowMs / 1000 / INTERVAL_S) * INTERVAL_S;
  const lines = [];
  for (let t = last - 4 * 3600; t <= last; t += INTERVAL_S) {
    const grown = Math.min(1, Math.max(0, (t - (last - 3.5 * 3600)) / 3600));
    const wobble = (t / INTERVAL_S) % 2 === 0 ? 0.03 : -0.03;
    const values = HEIGHTS_M.map((z) =>
      (-6 + (grown * 5 * Math.log(z / 2)) / Math.log(30) - z * 0.009 + wobble).toFixed(2),
    );
    lines.push([new Date(t * 1000).toISOString().replace('.000Z', 'Z'), ...values].join(','));
  }
  return { header: ['time', ...HEIGHTS_M.map((z) => `T ${z} m`)].join(','), lines };
}

/** Drops a logger's file into the folder the service collects from. */
export function dropFile(loggerDir, { header, lines }) {
  writeFileSync(path.join(loggerDir, FOLDER, 'today.csv'), `${[header, ...lines].join('\n')}\n`);
}

/** Pushes lines with the tower's key, as a logger would. */
export async function pushLines(baseUrl, key, { header, lines }) {
  const answer = await fetch(`${baseUrl}/api/ingest/readings`, {
    method: 'POST',
    headers: { Authorization: `Bearer ${key}`, 'Content-Type': 'text/csv' },
    body: `${[header, ...lines].join('\n')}\n`,
  });
  if (!answer.ok) throw new Error(`The push answered ${answer.status}: ${await answer.text()}`);
  return answer.json();
}

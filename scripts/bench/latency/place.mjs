const INTERVAL_S = 600;
const HEIGHTS_M = [2, 10, 30, 60];
const RULE = {
  advisory: {
    begin: { measure: 'strengthWithinTowerC', op: '>=', value: 2 },
    end: { measure: 'strengthWithinTowerC', op: '<', value: 1 },
    longestValidityHours: 24,
  },
};

/** A tower and a district of their own for one round, with a rule that one inverted profile meets. */
export async function makePlace({ admin, analyst }, n) {
  const place = { latitude: 44.05, longitude: -112.95, elevationM: 1150 };
  const logger = { intervalMinutes: 10, blockMinutes: 10, clock: 'UTC', stamp: 'end' };
  const tower = await admin.post('/api/towers', { name: `Mast ${n}`, ...place, ...logger });
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
    await admin.post(`/api/towers/${tower.id}/sensors`, sensor);
  }
  const { key } = await admin.post(`/api/towers/${tower.id}/keys`, { name: 'bench' });
  const district = await admin.post('/api/districts', {
    ...{ name: `District ${n}`, timeZone: 'America/Denver', ...place },
    towers: [{ towerId: tower.id, mayBegin: true, mayEnd: true }],
  });
  const draft = await analyst.post(`/api/districts/${district.id}/rules`, {
    body: RULE,
    note: 'For the bench.',
  });
  await analyst.post(`/api/rules/${draft.id}/put-in-force`);
  return { tower, district, key };
}

/** Two hours of readings as a logger pushes them: mixed air, and the last profile, which is inverted. */
export function readings(nowMs) {
  const last = Math.floor(nowMs / 1000 / INTERVAL_S) * INTERVAL_S;
  const line = (t, rise) =>
    [new Date(t * 1000).toISOString(), ...HEIGHTS_M.map((z) => (-5 + (rise * z) / 60).toFixed(2))].join(',');
  const times = Array.from({ length: 12 }, (_, i) => last - (12 - i) * INTERVAL_S);
  const header = ['time', ...HEIGHTS_M.map((z) => `T ${z} m`)].join(',');
  return {
    before: [header, ...times.map((t, i) => line(t, -0.6 - (i % 2) * 0.02))].join('\n'),
    inverted: [header, line(last, 4)].join('\n'),
  };
}

/** Pushes CSV with a tower's key. */
export async function push(baseUrl, key, body) {
  const headers = { Authorization: `Bearer ${key}`, 'Content-Type': 'text/csv' };
  const answer = await fetch(`${baseUrl}/api/ingest/readings`, { method: 'POST', headers, body });
  if (!answer.ok) throw new Error(`The push answered ${answer.status}: ${await answer.text()}`);
}

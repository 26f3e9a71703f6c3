/** Heights of every tower's thermometers, m. */
export const HEIGHTS_M = [2, 10, 20, 30, 45, 60];
/** Between readings, and of a block, s. */
export const INTERVAL_S = 300;
const BLOCK_MINUTES = 15;

const RULE = {
  advisory: {
    begin: { measure: 'strengthWithinTowerC', op: '>=', value: 2, heldMinutes: 120 },
    end: { measure: 'strengthWithinTowerC', op: '<', value: 1, heldMinutes: 60 },
    longestValidityHours: 24,
  },
};

async function makeOne({ admin, analyst }, n) {
  const place = { latitude: 44.05, longitude: -112.95, elevationM: 1150 };
  const logger = {
    intervalMinutes: INTERVAL_S / 60,
    blockMinutes: BLOCK_MINUTES,
    clock: 'UTC',
    stamp: 'end',
  };
  const tower = await admin.post('/api/towers', { name: `Mast ${n}`, ...place, ...logger });
  const sensorIds = [];
  for (const heightM of HEIGHTS_M) {
    const kind = { name: `T ${heightM} m`, quantity: 'air temperature', unit: '°C', limits: 0.1 };
    const from = new Date(0).toISOString();
    sensorIds.push((await admin.post(`/api/towers/${tower.id}/sensors`, { ...kind, heightM, from })).id);
  }
  const { key } = await admin.post(`/api/towers/${tower.id}/keys`, { name: 'bench' });
  const district = await admin.post('/api/districts', {
    ...{ name: `District ${n}`, timeZone: 'America/Denver', ...place },
    towers: [{ towerId: tower.id, mayBegin: true, mayEnd: true }],
  });
  const note = 'For the bench.';
  const draft = await analyst.post(`/api/districts/${district.id}/rules`, { body: RULE, note });
  await analyst.post(`/api/rules/${draft.id}/put-in-force`);
  return { towerId: tower.id, districtId: district.id, ruleId: draft.id, sensorIds, key };
}

/** Towers, each with a district it speaks for and a rule in force, made through the API. */
export async function makeDistricts(people, count) {
  const made = [];
  for (let n = 1; n <= count; n += 1) made.push(await makeOne(people, n));
  return made;
}

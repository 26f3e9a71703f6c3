import { signInAs, type SignedInAgent } from '../testing/people';
import { createTestApp, type TestApp } from '../testing/test-app';
import type { TowerDto } from './dto/tower.dto';

const place = { elevationM: 1150, latitude: 45, longitude: -110 };

describe('towers and districts through the API', () => {
  let test: TestApp;
  let admin: SignedInAgent;
  beforeAll(async () => {
    test = await createTestApp();
    admin = await signInAs(test, 'administrator');
  });
  afterAll(() => test.close());

  const make = async (name: string, changes: object = {}): Promise<TowerDto> => {
    const input = { name, ...place, intervalMinutes: 5, ...changes };
    return (await admin.http.post('/api/towers').send(input).expect(201)).body as TowerDto;
  };
  const addSensor = (towerId: number, changes: object = {}) =>
    admin.http
      .post(`/api/towers/${towerId}/sensors`)
      .send({ name: 't2', quantity: 'air temperature', heightM: 2, limits: 0.3, ...changes });

  it('a tower gets the usual block, and its sensors one standard deviation from the data sheet', async () => {
    const tower = await make('Mill mast');
    expect(tower).toMatchObject({
      slug: 'mill-mast',
      blockMinutes: 15,
      clock: 'UTC',
      stamp: 'end',
      version: 1,
    });
    const { body } = await addSensor(tower.id).expect(201);
    expect(body).toMatchObject({ unit: '°C', sigma: expect.closeTo(0.173, 3), offset: 0, gain: 1 });
    expect(await make('Tarn relay', { intervalMinutes: 10 })).toMatchObject({ blockMinutes: 10 });
  });

  it('what is wrong is said beside its field', async () => {
    const input = {
      name: '',
      ...place,
      intervalMinutes: 5,
      blockMinutes: 7,
      clock: 'Mountain',
      colour: 'red',
    };
    const { body } = await admin.http.post('/api/towers').send(input).expect(422);
    const fields = (body as { errors: { field: string }[] }).errors.map(({ field }) => field);
    expect(fields.sort()).toEqual(['clock', 'colour', 'name']);
    const uneven = { ...input, name: 'X', clock: 'UTC', colour: undefined };
    expect((await admin.http.post('/api/towers').send(uneven).expect(422)).body).toMatchObject({
      errors: [
        { field: 'blockMinutes', text: 'A block is a whole multiple of the interval: choose 5, 10, ….' },
      ],
    });
    const { id } = await make('Errors');
    for (const [changes, field] of [
      [{ limits: undefined }, 'sigma'],
      [{ unit: 'K' }, 'unit'],
      [{ quantity: 'colour' }, 'quantity'],
    ] as const) {
      expect((await addSensor(id, changes).expect(422)).body).toMatchObject({ errors: [{ field }] });
    }
    await addSensor(id).expect(201);
    expect((await addSensor(id).expect(409)).body).toMatchObject({ code: 'name-taken' });
  });

  it('the second of two people who change a tower is told', async () => {
    const { id } = await make('Contended');
    await admin.http.patch(`/api/towers/${id}`).send({ version: 1, name: 'First' }).expect(200);
    const second = await admin.http
      .patch(`/api/towers/${id}`)
      .send({ version: 1, name: 'Second' })
      .expect(409);
    expect(second.body).toMatchObject({ code: 'changed-meanwhile' });
    const { body } = await admin.http.get(`/api/towers/${id}`).expect(200);
    expect(body).toMatchObject({ name: 'First', version: 2 });
  });

  it('a sensor replaced on Tuesday does not rewrite Monday', async () => {
    const { id } = await make('Replaced');
    const { body } = await addSensor(id).expect(201);
    const sensorId = (body as { id: number }).id;
    const change = { from: '2026-01-13T12:00:00Z', offset: 0.4, heightM: 2.5, note: 'new thermometer' };
    const changed = await admin.http.patch(`/api/sensors/${sensorId}`).send(change).expect(200);
    expect(changed.body).toMatchObject({
      versions: [
        { from: null, heightM: 2, offset: 0 },
        { from: '2026-01-13T12:00:00Z', heightM: 2.5, offset: 0.4, gain: 1, note: 'new thermometer' },
      ],
    });
  });

  it('a folder source stays beneath the loggers’ folder', async () => {
    const { id } = await make('Sourced');
    const source = (path: string) =>
      admin.http.post(`/api/towers/${id}/sources`).send({ kind: 'folder', path });
    for (const path of ['/etc/passwd', '../secret', 'a/../../b']) await source(path).expect(422);
    await source('sourced').expect(201);
    const { body } = await admin.http.get(`/api/towers/${id}/sources`).expect(200);
    expect(body).toMatchObject([{ kind: 'folder', path: 'sourced', intervalSeconds: 60, failures: 0 }]);
  });

  it('a district names towers that exist, in the order in which they are asked', async () => {
    const [floor, bench] = [await make('Floor'), await make('Bench')];
    const input = {
      ...{
        name: 'Mill Flats',
        timeZone: 'America/Boise',
        latitude: 45,
        longitude: -110,
        floorTowerId: floor.id,
      },
      towers: [{ towerId: floor.id }, { towerId: bench.id, mayEnd: false }],
    };
    const wrong = { ...input, towers: [{ towerId: 9999 }] };
    expect((await admin.http.post('/api/districts').send(wrong).expect(422)).body).toMatchObject({
      errors: [{ field: 'towers' }],
    });
    const { body } = await admin.http.post('/api/districts').send(input).expect(201);
    expect(body).toMatchObject({
      slug: 'mill-flats',
      towers: [
        { towerId: floor.id, mayBegin: true, mayEnd: true },
        { towerId: bench.id, mayBegin: true, mayEnd: false },
      ],
    });
    await admin.http.post('/api/districts').send(input).expect(409);
    const { id } = body as { id: number };
    const patch = { version: 1, towers: [{ towerId: bench.id }] };
    const patched = await admin.http.patch(`/api/districts/${id}`).send(patch).expect(200);
    expect(patched.body).toMatchObject({ version: 2, towers: [{ towerId: bench.id }] });
    await admin.http.patch(`/api/districts/${id}`).send(patch).expect(409);
  });
});

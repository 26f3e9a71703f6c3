import { DirtyStages } from '../database/dirty';
import { OutboxDispatcher } from '../outbox/outbox-dispatcher';
import type { OutboundMessage } from '../outbox/channel';
import { ReadingsService } from '../readings/readings.service';
import { DistrictFindingsService } from '../rules/findings/district-findings.service';
import { makeUser, signInAs, type SignedInAgent } from '../testing/people';
import { createTestApp, type TestApp } from '../testing/test-app';
import { inversion, makeValley, type Valley } from '../testing/valley';
import type { TroubleDto } from './dto/trouble.dto';
import { TroublesService } from './troubles.service';

jest.setTimeout(30_000);

describe('troubles of towers', () => {
  let test: TestApp;
  let valley: Valley;
  let analyst: SignedInAgent;
  const mails: OutboundMessage[] = [];

  beforeAll(async () => {
    test = await createTestApp();
    valley = await makeValley(test, [{}, {}, {}]);
    analyst = await signInAs(test, 'analyst');
    await makeUser(test, 'officer');
    test.app.get(OutboxDispatcher, { strict: false }).registerChannel('email', {
      atOnce: 1,
      send: async (message) => {
        mails.push(message);
        return { kind: 'accepted' };
      },
    });
  });
  afterAll(() => test.close());
  beforeEach(() => void (mails.length = 0));

  /** Lets time go by as the job would see it; the towers named give a reading at each step. */
  async function pass(minutes: number, giving: readonly number[], stepMinutes = 10): Promise<void> {
    for (let i = 0; i < minutes; i += stepMinutes) {
      test.clock.advance(stepMinutes * 60);
      const now = test.clock.now();
      for (const tower of giving) await valley.give(tower, now, inversion(3, now));
      await test.app.get(TroublesService, { strict: false }).look();
    }
    await test.app.get(DirtyStages, { strict: false }).drainAll();
    await test.app.get(OutboxDispatcher, { strict: false }).dispatch();
  }
  const open = (): Promise<TroubleDto[]> => test.app.get(TroublesService, { strict: false }).list(true);
  const finding = () => test.app.get(DistrictFindingsService, { strict: false }).latest(valley.districtId);

  it('are none while every tower is heard', async () => {
    await pass(20, [0, 1, 2]);
    expect((await analyst.http.get('/api/troubles?open=true').expect(200)).body).toEqual([]);
    await analyst.http.get('/api/troubles?open=perhaps').expect(422);
    expect(mails).toEqual([]);
  });

  it('are told once, in one mail for towers that fail together, and the district turns to not known by itself', async () => {
    expect(await finding()).toMatchObject({ fresh: true, silent: [] });
    await pass(120, []);
    expect((await open()).map(({ kind, mailsAccepted }) => [kind, mailsAccepted])).toEqual([
      ['late', 1],
      ['late', 1],
      ['late', 1],
    ]);
    expect(mails).toHaveLength(1);
    expect(mails[0]).toMatchObject({ address: analyst.email, isToStaff: true });
    expect(mails[0]!.text).toContain(`/readings/towers/${valley.towerIds[0]}`);
    expect(await finding()).toMatchObject({
      fresh: false,
      reason: expect.stringContaining('no tower has answered for'),
    });
    await pass(240, [], 60);
    expect(mails).toHaveLength(1);
  });

  it('are over once the tower is heard for a while, and that is told once', async () => {
    await pass(20, [0, 1, 2]);
    expect(await open()).toHaveLength(3);
    await pass(60, [0, 1, 2]);
    expect(await open()).toEqual([]);
    expect(mails.map(({ subject }) => subject)).toEqual([expect.stringContaining('the trouble is over')]);
  });

  it('become silence after a day, told once more', async () => {
    await pass(80, [1, 2], 20);
    await pass(25 * 60, [1, 2], 25 * 60);
    await pass(10, [1, 2]);
    expect((await open()).map(({ kind }) => kind)).toEqual(['silent']);
    expect(mails.map(({ subject }) => subject)).toEqual([
      expect.stringMatching(/is late$/),
      expect.stringMatching(/is silent$/),
    ]);
    await pass(60, [0, 1, 2]);
    expect(await open()).toEqual([]);
  });

  it('are not hidden by a reading from the future', async () => {
    const sensor = await test.sql.get<{ id: number }>('SELECT id FROM sensor WHERE tower_id = $1', [
      valley.towerIds[0],
    ]);
    const rows = [{ sensorId: sensor!.id, tEnd: test.clock.now() + 5 * 3600, value: 1, rowNo: 1 }];
    await test.app
      .get(ReadingsService, { strict: false })
      .ingest(valley.towerIds[0]!, rows, { origin: 'push', name: 'x' });
    await pass(60, [1, 2]);
    expect((await open()).map(({ kind, towerId }) => [kind, towerId])).toEqual([
      ['late', valley.towerIds[0]],
    ]);
    await pass(60, [0, 1, 2]);
  });

  it('are told to those who work here now, at the e-mail they have now', async () => {
    const other = await makeUser(test, 'analyst');
    await test.sql.run("UPDATE user SET email = 'new@pellworth.example' WHERE id = $1", [analyst.id]);
    await test.sql.run('UPDATE user SET retired_at = $2 WHERE id = $1', [other.id, test.clock.now()]);
    await pass(90, [0, 1]);
    expect(mails.map(({ address }) => address)).toEqual(['new@pellworth.example']);
    await pass(60, [0, 1, 2]);
  });

  it('tell of a clock that was put back by an hour, and that it was put right', async () => {
    const put = async (byS: number, steps: number): Promise<void> => {
      for (let i = 0; i < steps; i++) {
        await pass(10, [0, 1]);
        const now = test.clock.now();
        const air = inversion(2.5, now).map((each) => each + (byS ? 0.3 : 0));
        await valley.give(2, now + byS, air);
      }
      await pass(10, [0, 1]);
    };
    await put(0, 10);
    await put(-3600, 6);
    const [trouble] = await open();
    expect(trouble).toMatchObject({ kind: 'clock shifted', towerId: valley.towerIds[2] });
    expect(trouble!.text).toContain('exactly an hour behind');
    await put(0, 8);
    expect(await open()).toEqual([]);
  });

  it('tell of a clock that is ahead: such rows are refused and count for nothing', async () => {
    const admin = await signInAs(test, 'administrator');
    const towerId = valley.towerIds[1]!;
    const { body } = await admin.http.post(`/api/towers/${towerId}/keys`).send({ name: 'x' }).expect(201);
    const at = (s: number) => new Date((test.clock.now() + s) * 1000).toISOString();
    const lines = [3600, 4200, 4800].map((s) => `${at(s)},-5`);
    const sent = await test.http
      .post('/api/ingest/readings')
      .set('Authorization', `Bearer ${(body as { key: string }).key}`)
      .set('Content-Type', 'text/csv')
      .send(['time,temperature_2m', ...lines].join('\n'))
      .expect(200);
    expect(sent.body).toMatchObject({ new: 0, refused: 3 });
    await pass(10, [0, 1, 2]);
    const [trouble] = await open();
    expect(trouble).toMatchObject({ kind: 'clock ahead', towerId });
    expect(trouble!.text).toMatch(/in the future.*zone/);
  });

  it('leave the residents’ counts as they are', async () => {
    const counts = await test.sql.all('SELECT * FROM subscription');
    expect(counts).toEqual([]);
    const contacts = await test.sql.all<{ address: string | null }>('SELECT address FROM contact');
    expect(contacts.every(({ address }) => address === null)).toBe(true);
  });
});

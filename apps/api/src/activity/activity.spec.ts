import { migrate } from '../database/migrate';
import { SetClock } from '../common/clock';
import { openTestStore, type TestStore } from '../testing/test-store';
import { ActivityLogService } from './activity-log.service';
import { ActivityService } from './activity.service';

const officer = { id: 7, name: 'R. Ortega', role: 'officer' as const, districtIds: [1] };
const analyst = { id: 8, name: 'T. Nakai', role: 'analyst' as const, districtIds: [] };
const administrator = { id: 9, name: 'L. Brandt', role: 'administrator' as const, districtIds: [] };

describe('the record of what was done', () => {
  let store: TestStore;
  let record: ActivityService;
  let log: ActivityLogService;
  beforeEach(async () => {
    store = await openTestStore();
    await migrate(store.sequelize);
    record = new ActivityService(store.sql, store.units, new SetClock(1_768_525_200));
    log = new ActivityLogService(store.sql);
  });
  afterEach(() => store.close());

  const page = { page: 1, pageSize: 50 };
  const some = async (): Promise<void> => {
    await record.record({
      actor: analyst,
      act: 'confirmed a proposal',
      subject: 'proposal 1',
      districtId: 1,
    });
    await record.record({
      actor: officer,
      act: 'issued a notice',
      subject: 'notice 1',
      districtId: 1,
      body: { why: 'smoke' },
    });
    await record.record({ actor: 'service', act: 'expired a notice', subject: 'notice 2', districtId: 2 });
  };

  it('chains entries, and finds one that was changed behind its back', async () => {
    await some();
    expect(await log.firstBroken()).toBeUndefined();
    await store.sql.run('DROP TRIGGER activity_no_update');
    await store.sql.run("UPDATE activity SET actor = 'somebody else' WHERE seq = 2");
    expect(await log.firstBroken()).toBe(2);
  });

  it('finds an entry that was taken out', async () => {
    await some();
    await store.sql.run('DROP TRIGGER activity_no_delete');
    await store.sql.run('DELETE FROM activity_body WHERE seq = 2');
    await store.sql.run('DELETE FROM activity WHERE seq = 2');
    expect(await log.firstBroken()).toBe(3);
  });

  it('holds when a body was erased', async () => {
    await some();
    await store.sql.run('DELETE FROM activity_body WHERE seq = 2');
    expect(await log.firstBroken()).toBeUndefined();
  });

  it('is append-only', async () => {
    await some();
    await expect(store.sql.run("UPDATE activity SET act = 'nothing'")).rejects.toThrow();
    await expect(store.sql.run('DELETE FROM activity')).rejects.toThrow();
  });

  it('stands or falls with the deed', async () => {
    const failing = store.units.run(async () => {
      await record.record({ actor: 'service', act: 'tried', subject: 'nothing' });
      throw new Error('on purpose');
    });
    await expect(failing).rejects.toThrow('on purpose');
    expect((await log.page(administrator, page)).total).toBe(0);
  });

  it.each([
    [administrator, ['notice 2', 'notice 1', 'proposal 1']],
    [analyst, ['proposal 1']],
    [officer, ['notice 1', 'proposal 1']],
  ])('shows $role what is theirs to see', async (reader, subjects) => {
    await some();
    const { items, total } = await log.page(reader, page);
    expect(items.map(({ subject }) => subject)).toEqual(subjects);
    expect(total).toBe(subjects.length);
  });
});

import { StartFault } from '../common/start-fault';
import { openTestStore, type TestStore } from '../testing/test-store';
import { migrate } from './migrate';

const first = { name: '0001-first', up: ['CREATE TABLE one (id INTEGER PRIMARY KEY) STRICT'] };
const broken = {
  name: '0002-broken',
  up: ['CREATE TABLE two (id INTEGER PRIMARY KEY) STRICT', 'CREATE NONSENSE'],
};

describe('migrations', () => {
  let store: TestStore;
  beforeEach(async () => (store = await openTestStore()));
  afterEach(() => store.close());

  const tables = async () =>
    (
      await store.sql.all<{ name: string }>(
        "SELECT name FROM pragma_table_list WHERE schema = 'main' ORDER BY name",
      )
    )
      .map(({ name }) => name)
      .filter((name) => !name.startsWith('sqlite_'));

  it('make the whole store, once', async () => {
    await migrate(store.sequelize);
    const made = await tables();
    expect(made).toEqual(
      expect.arrayContaining(['activity', 'district', 'notice', 'outbox', 'reading', 'user']),
    );
    await migrate(store.sequelize);
    expect(await tables()).toEqual(made);
  });

  it('undo a step that fails half-way, and say which', async () => {
    await expect(migrate(store.sequelize, [first, broken])).rejects.toThrow('0002-broken');
    expect(await tables()).toEqual(['migration', 'one']);
  });

  it('refuse a database that a newer version made', async () => {
    await migrate(store.sequelize, [first]);
    await expect(migrate(store.sequelize, [])).rejects.toThrow(StartFault);
  });
});

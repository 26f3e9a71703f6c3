import { openTestStore, signal, type TestStore } from '../testing/test-store';

describe('a unit of work', () => {
  let store: TestStore;
  beforeEach(async () => {
    store = await openTestStore(
      'CREATE TABLE a (id INTEGER PRIMARY KEY, v INTEGER NOT NULL)',
      'CREATE TABLE b (a_id INTEGER REFERENCES a(id) DEFERRABLE INITIALLY DEFERRED)',
    );
  });
  afterEach(() => store.close());

  const add = (v: number) => store.sql.run('INSERT INTO a (v) VALUES ($1)', [v]);
  const values = async () =>
    (await store.sql.all<{ v: number }>('SELECT v FROM a ORDER BY id')).map(({ v }) => v);

  it('keeps everything or nothing', async () => {
    await store.units.run(async () => {
      await add(1);
      await add(2);
    });
    const failing = store.units.run(async () => {
      await add(3);
      throw new Error('on purpose');
    });
    await expect(failing).rejects.toThrow('on purpose');
    expect(await values()).toEqual([1, 2]);
  });

  it('joins the one that is running, so that the outer error undoes the inner work', async () => {
    const outer = store.units.run(async () => {
      await store.units.run(() => add(1));
      throw new Error('on purpose');
    });
    await expect(outer).rejects.toThrow('on purpose');
    expect(await values()).toEqual([]);
  });

  it('reads what it wrote itself; others read what was there before', async () => {
    const wrote = signal();
    const seen = signal();
    const unit = store.units.run(async () => {
      await add(1);
      wrote.give();
      await seen.given;
      return values();
    });
    await wrote.given;
    expect(await values()).toEqual([]);
    seen.give();
    expect(await unit).toEqual([1]);
  });

  it('takes parallel statements into the same transaction', async () => {
    await store.units.run(() => Promise.all([1, 2, 3, 4, 5].map(add)));
    expect((await values()).sort()).toEqual([1, 2, 3, 4, 5]);
  });

  it('lets work that outlived the commit write on its own account', async () => {
    const committed = signal();
    let late: Promise<number> = Promise.resolve(0);
    await store.units.run(async () => {
      await add(1);
      late = committed.given.then(() => add(2));
    });
    committed.give();
    await late;
    expect(await values()).toEqual([1, 2]);
  });

  it('refuses a late write of what was rolled back, but not a new unit', async () => {
    const over = signal();
    let late: Promise<number> = Promise.resolve(0);
    let own: Promise<number> = Promise.resolve(0);
    const failing = store.units.run(async () => {
      late = over.given.then(() => add(2));
      own = over.given.then(() => store.units.run(() => add(3)));
      throw new Error('on purpose');
    });
    await expect(failing).rejects.toThrow('on purpose');
    over.give();
    await expect(late).rejects.toThrow('rolled back');
    await own;
    expect(await values()).toEqual([3]);
  });

  it('calls back after the commit only', async () => {
    const heard: string[] = [];
    await store.units.run(async () => {
      store.units.afterCommit(() => heard.push('committed'));
      await add(1);
      expect(heard).toEqual([]);
    });
    const failing = store.units.run(async () => {
      store.units.afterCommit(() => heard.push('never'));
      throw new Error('on purpose');
    });
    await expect(failing).rejects.toThrow('on purpose');
    store.units.afterCommit(() => heard.push('outside'));
    expect(heard).toEqual(['committed', 'outside']);
  });

  it('gives the write handle back when the commit itself fails', async () => {
    const warn = jest.spyOn(console, 'warn').mockImplementation(() => undefined);
    const failing = store.units.run(() => store.sql.run('INSERT INTO b (a_id) VALUES (99)'));
    await expect(failing).rejects.toThrow();
    await store.units.run(() => add(1));
    expect(await values()).toEqual([1]);
    expect(await store.sql.all('SELECT * FROM b')).toEqual([]);
    warn.mockRestore();
  });

  it('throws instead of waiting for itself', async () => {
    const warn = jest.spyOn(console, 'warn').mockImplementation(() => undefined);
    const unit = store.units.run(async () => {
      await store.sequelize.query('INSERT INTO a (v) VALUES (1)', { transaction: null });
    });
    await expect(unit).rejects.toThrow('already holds the write handle');
    await expect(store.units.run(() => store.sequelize.transaction())).rejects.toThrow('already holds');
    warn.mockRestore();
  });
});

import { QueryTypes } from 'sequelize';
import { OPEN_READONLY } from 'sqlite3';
import { openTestStore, signal, type TestStore } from '../testing/test-store';
import { closeStore } from './close-store';
import { closeHandle, openHandle } from './handles';

describe('the single writer', () => {
  let store: TestStore;
  beforeEach(async () => {
    store = await openTestStore(
      'CREATE TABLE counter (id INTEGER PRIMARY KEY, v INTEGER NOT NULL)',
      'INSERT INTO counter VALUES (1, 0)',
      'CREATE TABLE load (k INTEGER PRIMARY KEY, chunk INTEGER NOT NULL)',
      'CREATE TABLE log (seq INTEGER PRIMARY KEY, who TEXT NOT NULL)',
    );
  });
  afterEach(() => store.close());

  const log = (who: string) => store.sql.run('INSERT INTO log (who) VALUES ($1)', [who]);

  /** Reads and writes in two statements: an increment is lost if two of them ever overlap. */
  const increment = (k: number) =>
    store.units.run(async () => {
      const row = await store.sql.get<{ v: number }>('SELECT v FROM counter WHERE id = 1');
      await store.sql.run('UPDATE counter SET v = $1 WHERE id = 1', [(row?.v ?? 0) + 1]);
      await log(`person ${k}`);
    });

  const loadChunk = (chunk: number, rows: number) =>
    store.units.run(async () => {
      const keys = JSON.stringify(Array.from({ length: rows }, (_, i) => chunk * rows + i));
      await store.sql.run('INSERT INTO load (k, chunk) SELECT value, $2 FROM json_each($1)', [keys, chunk]);
      await log(`bulk ${chunk}`);
    }, 'bulk');

  it('takes 100 writers and a long bulk load side by side: nothing is lost and people go first', async () => {
    const chunks = 40;
    const rows = 5000;
    const bulk = Promise.all(Array.from({ length: chunks }, (_, chunk) => loadChunk(chunk, rows)));
    const people = Promise.all(Array.from({ length: 100 }, (_, k) => increment(k)));
    await Promise.all([bulk, people]);

    expect(await store.sql.get('SELECT v FROM counter')).toEqual({ v: 100 });
    expect(await store.sql.get('SELECT count(*) AS n, count(DISTINCT chunk) AS chunks FROM load')).toEqual({
      n: chunks * rows,
      chunks,
    });
    const order = (await store.sql.all<{ who: string }>('SELECT who FROM log ORDER BY seq')).map(
      ({ who }) => who,
    );
    const wanted = (kind: string, n: number) => Array.from({ length: n }, (_, k) => `${kind} ${k}`);
    expect(order.filter((who) => who.startsWith('person'))).toEqual(wanted('person', 100));
    expect(order.filter((who) => who.startsWith('bulk'))).toEqual(wanted('bulk', chunks));
    const lastPerson = order.lastIndexOf('person 99');
    expect(order.slice(0, lastPerson).filter((who) => who.startsWith('bulk')).length).toBeLessThanOrEqual(1);
  });

  it('lets reads through while a write is under way', async () => {
    const holding = signal();
    const finish = signal();
    const writing = store.units.run(async () => {
      await store.sql.run('UPDATE counter SET v = 7');
      holding.give();
      await finish.given;
    });
    await holding.given;
    const reads = await Promise.all(
      Array.from({ length: 100 }, () => store.sql.get<{ v: number }>('SELECT v FROM counter')),
    );
    expect(new Set(reads.map((row) => row?.v))).toEqual(new Set([0]));
    finish.give();
    await writing;
    expect(await store.sql.get('SELECT v FROM counter')).toEqual({ v: 7 });
  });

  it('sets the pragmas on every handle', async () => {
    const asked =
      'SELECT (SELECT foreign_keys FROM pragma_foreign_keys) AS keys, (SELECT synchronous FROM pragma_synchronous) AS sync, (SELECT query_only FROM pragma_query_only) AS readOnly, (SELECT journal_mode FROM pragma_journal_mode) AS journal';
    const writer = await store.units.run(() => store.sql.get(asked));
    expect(writer).toMatchObject({ keys: 1, sync: 1, readOnly: 0, journal: 'wal' });
    const readers = await Promise.all([1, 2, 3].map(() => store.sql.get(asked)));
    for (const reader of readers) expect(reader).toMatchObject({ readOnly: 1, journal: 'wal' });
  });

  it('tells how many rows a statement changed, and the rows of RETURNING', async () => {
    expect(await store.sql.run('UPDATE counter SET v = 1 WHERE id = 1 AND v = 5')).toBe(0);
    expect(await store.sql.run('UPDATE counter SET v = 1 WHERE id = 1')).toBe(1);
    const made = await store.sql.returning(
      'WITH j AS (SELECT 5 AS v) INSERT INTO counter (v) SELECT v FROM j RETURNING id, v',
    );
    expect(made).toEqual([{ id: 2, v: 5 }]);
    expect(await store.sql.returning('INSERT INTO counter (v) VALUES (1) RETURNING id')).toEqual([{ id: 3 }]);
    await expect(store.sql.run('INSERT INTO counter (v) VALUES ($1)', [undefined])).rejects.toThrow(
      '$1 has no value',
    );
  });

  it('knows the columns of a table that has changed since they were asked for', async () => {
    const columns = async () =>
      (await store.sequelize.query('PRAGMA table_info(`log`)', { type: QueryTypes.SELECT })).length;
    expect([await columns(), await columns()]).toEqual([2, 2]);
    await store.sql.run('ALTER TABLE log ADD COLUMN note TEXT');
    expect(await columns()).toBe(3);
  });

  it('finishes the transaction under way before it closes', async () => {
    const holding = signal();
    const finish = signal();
    const writing = store.units.run(async () => {
      holding.give();
      await finish.given;
      await store.sql.run('UPDATE counter SET v = 9');
    });
    await holding.given;
    const closing = closeStore(store.sequelize);
    finish.give();
    await Promise.all([writing, closing]);
    const again = await openHandle(store.file, OPEN_READONLY, '');
    const row = await new Promise((resolve) =>
      again.get('SELECT v FROM counter', (_, found) => resolve(found)),
    );
    await closeHandle(again);
    expect(row).toEqual({ v: 9 });
  });
});

import { onlyReads, transactionStep } from './statement-kind';

const reads = [
  'SELECT 1',
  '  select * from reading',
  'EXPLAIN QUERY PLAN SELECT 1',
  'WITH j AS (SELECT 1) SELECT * FROM j',
  "WITH j AS (SELECT 1) SELECT replace('a', 'b', 'c') FROM j",
  'PRAGMA table_info(`user`)',
  'PRAGMA foreign_keys;',
];
const writes = [
  'INSERT INTO a VALUES (1)',
  'UPDATE a SET v = 1',
  'DELETE FROM a',
  'CREATE TABLE a (v)',
  'WITH j AS (SELECT 1) INSERT INTO a SELECT * FROM j RETURNING v',
  'WITH j AS (SELECT 1) INSERT OR IGNORE INTO a SELECT * FROM j',
  'WITH j AS (SELECT 1) UPDATE a SET v = 1',
  'WITH j AS (SELECT 1) DELETE FROM a',
  'PRAGMA journal_mode = DELETE',
  'PRAGMA optimize',
  'PRAGMA wal_checkpoint(TRUNCATE)',
  'VACUUM',
];

describe('the kind of a statement', () => {
  it.each(reads)('reads: %s', (sql) => expect(onlyReads(sql)).toBe(true));
  it.each(writes)('writes: %s', (sql) => expect(onlyReads(sql)).toBe(false));
  it.each([
    ['BEGIN IMMEDIATE TRANSACTION;', 'begin'],
    ['COMMIT;', 'commit'],
    ['ROLLBACK;', 'rollback'],
    ['ROLLBACK TO SAVEPOINT x;', undefined],
    ['SAVEPOINT x;', undefined],
    ['SELECT 1', undefined],
  ])('%s is %s', (sql, step) => expect(transactionStep(sql)).toBe(step));
});

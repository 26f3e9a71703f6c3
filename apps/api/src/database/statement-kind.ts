const readOnlyPragma =
  /^\s*PRAGMA\s+(table_info|table_xinfo|index_list|index_info|foreign_key_list)\b|^\s*PRAGMA\s+\w+\s*;?\s*$/i;
const writesSomething = /\b(INSERT\s+(OR\s+\w+\s+)?INTO|REPLACE\s+INTO|UPDATE\s[^;]*?\bSET|DELETE\s+FROM)\b/i;

/**
 * Whether a statement only reads. In doubt the answer is no: a read at the gate is merely slower, and a write that
 * went to a read handle would be refused by SQLite.
 */
export function onlyReads(sql: string): boolean {
  if (/^\s*(SELECT|EXPLAIN)\b/i.test(sql)) return true;
  if (/^\s*WITH\b/i.test(sql)) return !writesSomething.test(sql);
  return readOnlyPragma.test(sql) && !/optimize|wal_checkpoint|incremental_vacuum/i.test(sql);
}

/** What a statement does to a transaction, if anything. */
export function transactionStep(sql: string): 'begin' | 'commit' | 'rollback' | undefined {
  if (/^\s*BEGIN\b/i.test(sql)) return 'begin';
  if (/^\s*(COMMIT|END)\b/i.test(sql)) return 'commit';
  if (/^\s*ROLLBACK\b(?!\s+(TRANSACTION\s+)?TO\b)/i.test(sql)) return 'rollback';
  return undefined;
}

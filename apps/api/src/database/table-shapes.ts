import type { SqliteCall } from './sqlite-call';

const ASKS = /^\s*PRAGMA\s+table_info\b/i;
const CHANGES = /^\s*(CREATE|ALTER|DROP)\b/i;

/**
 * Remembers the columns of tables. Sequelize asks for them before each read of a model, and they change by migrations
 * only; a statement that changes the schema makes it forget.
 */
export class TableShapes {
  private readonly known = new Map<string, unknown>();

  /** Answers a call that asks for known columns at once and says so; listens to the answer of one that is new. */
  answers(call: SqliteCall): boolean {
    if (CHANGES.test(call.sql)) this.known.clear();
    if (!ASKS.test(call.sql)) return false;
    const rows = this.known.get(call.sql);
    if (rows !== undefined) {
      call.answer.call(undefined, null, rows);
      return true;
    }
    const { answer } = call;
    call.answer = (error, found) => {
      if (!error) this.known.set(call.sql, found);
      answer.call(undefined, error, found);
    };
    return false;
  }
}

import type { Database } from 'sqlite3';

/** How sqlite3 answers: `this` is the statement with `lastID` and `changes`. */
export type Answer = (this: unknown, error: Error | null, rows?: unknown) => void;

/** One call as sequelize makes it on a connection. */
export interface SqliteCall {
  method: 'run' | 'all' | 'get' | 'exec';
  sql: string;
  bind: unknown;
  answer: Answer;
}

/** Makes the call on a handle; `before` hears of the outcome before the caller does. */
export function callOn(handle: Database, call: SqliteCall, before: (error: Error | null) => void): void {
  const { method, sql, bind, answer } = call;
  const heard: Answer = function (error, rows) {
    before(error);
    answer.call(this, error, rows);
  };
  if (method === 'exec') handle.exec(sql, heard);
  else if (bind === undefined) handle[method](sql, heard);
  else handle[method](sql, bind, heard);
}

/** Answers a call with an error, without a statement. */
export function refuse(call: SqliteCall, error: unknown): void {
  call.answer.call(undefined, error instanceof Error ? error : new Error(String(error)));
}

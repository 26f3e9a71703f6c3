import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { DatabaseError, type Sequelize } from 'sequelize';
import type { SqliteCall } from './sqlite-call';
import { openUnit } from './unit-context';

/** Values for a statement: an array for `$1 $2 …` or an object for `$name`. */
export type Bind = unknown[] | Record<string, unknown>;

/** What sqlite3 answers a call on a connection: its rows, and how many were changed. */
interface Outcome<T> {
  readonly rows: T[];
  readonly changes: number;
}

/** One of sequelize's connections, as `singleWriterDialect` makes them. */
type Connection = Record<
  SqliteCall['method'],
  (sql: string, bind: object, answer: SqliteCall['answer']) => void
>;

/**
 * Plain SQL for what models are too slow or too narrow for. Inside a transaction it is part of it; outside, reads go
 * to the read handles and each write is a transaction of its own. It speaks to sequelize's connections directly, for
 * sequelize's own way with plain SQL costs several times what most of these statements do.
 */
@Injectable()
export class Sql {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Every row of a query. */
  async all<T extends object>(sql: string, bind: Bind = []): Promise<T[]> {
    return (await this.call<T>('all', sql, bind)).rows;
  }

  /** The first row of a query, undefined when there is none. */
  async get<T extends object>(sql: string, bind: Bind = []): Promise<T | undefined> {
    return (await this.all<T>(sql, bind))[0];
  }

  /** Runs a statement that answers no rows; resolves with the number of rows it changed. */
  async run(sql: string, bind: Bind = []): Promise<number> {
    return (await this.call('run', sql, bind)).changes;
  }

  /** The rows of a statement with RETURNING. */
  returning<T extends object>(sql: string, bind: Bind = []): Promise<T[]> {
    return this.all<T>(sql, bind);
  }

  private async call<T>(method: 'all' | 'run', sql: string, bind: Bind): Promise<Outcome<T>> {
    const connection = await this.connection();
    return new Promise((resolve, reject) => {
      connection[method](sql, named(bind, sql), function (this: unknown, error, rows) {
        if (error) reject(new DatabaseError(Object.assign(error, { sql })));
        else resolve({ rows: (rows ?? []) as T[], changes: (this as { changes?: number }).changes ?? 0 });
      });
    });
  }

  /** That of the running transaction, else the plain one that all statements outside of transactions share. */
  private async connection(): Promise<Connection> {
    const transaction = openUnit()?.transaction as { connection?: Connection } | undefined;
    if (transaction?.connection) return transaction.connection;
    return (await this.sequelize.connectionManager.getConnection({ type: 'write' })) as Connection;
  }
}

/** The values by the names they have in the statement; a missing one is an error, for SQLite would take it as NULL. */
function named(bind: Bind, sql: string): Record<string, unknown> {
  const values: Record<string, unknown> = {};
  for (const [key, value] of Object.entries(bind)) {
    const name = Array.isArray(bind) ? `$${Number(key) + 1}` : `$${key}`;
    if (value === undefined) throw new Error(`${name} has no value in: ${sql}`);
    values[name] = value;
  }
  return values;
}

import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, type Sequelize } from 'sequelize';

/** Values for a statement: an array for `$1 $2 …` or an object for `$name`. */
export type Bind = unknown[] | Record<string, unknown>;

/**
 * Plain SQL for what models are too slow or too narrow for. Inside a transaction it is part of it; outside, reads go
 * to the read handles and each write is a transaction of its own.
 */
@Injectable()
export class Sql {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Every row of a query. */
  all<T extends object>(sql: string, bind: Bind = []): Promise<T[]> {
    return this.sequelize.query<T>(sql, { bind, type: QueryTypes.SELECT, raw: true });
  }

  /** The first row of a query, undefined when there is none. */
  async get<T extends object>(sql: string, bind: Bind = []): Promise<T | undefined> {
    return (await this.all<T>(sql, bind))[0];
  }

  /** Runs a statement that answers no rows; resolves with the number of rows it changed. */
  async run(sql: string, bind: Bind = []): Promise<number> {
    const [, changes] = await this.sequelize.query(sql, { bind, type: QueryTypes.UPDATE });
    return changes;
  }

  /**
   * The rows of a statement with RETURNING. An INSERT has to begin with WITH, because sequelize answers nothing for
   * one that begins with INSERT.
   */
  returning<T extends object>(sql: string, bind: Bind = []): Promise<T[]> {
    if (/^\s*(INSERT|REPLACE)\b/i.test(sql))
      throw new Error('Begin an INSERT … RETURNING with WITH, such as WITH j AS (SELECT …) INSERT ….');
    return this.all<T>(sql, bind);
  }
}

import { Injectable } from '@nestjs/common';
import { HealthIndicatorService, type HealthIndicatorResult } from '@nestjs/terminus';
import { migrations } from '../database/migrations';
import { Sql } from '../database/sql';

/** Whether the store answers and its schema is the one this version needs. */
@Injectable()
export class StoreHealth {
  constructor(
    private readonly indicators: HealthIndicatorService,
    private readonly sql: Sql,
  ) {}

  async check(): Promise<HealthIndicatorResult<'database'>> {
    const database = this.indicators.check('database');
    const done = await this.sql.get<{ n: number }>('SELECT count(*) AS n FROM migration');
    return done?.n === migrations.length ? database.up() : database.down('The schema is not up to date.');
  }
}

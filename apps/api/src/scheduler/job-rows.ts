import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { Job } from './job';

/** How a job's last run went, as its row keeps it. */
export interface JobRow {
  name: string;
  lastStartedAt: number | null;
  lastEndedAt: number | null;
  lastResult: string | null;
  nextAt: number | null;
  runs: number;
  failures: number;
}

/** The rows of the jobs. */
@Injectable()
export class JobRows {
  constructor(private readonly sql: Sql) {}

  /** Every job's row by name. */
  list(): Promise<JobRow[]> {
    return this.sql.all<JobRow>(
      `SELECT name, last_started_at AS lastStartedAt, last_ended_at AS lastEndedAt, last_result AS lastResult,
              next_at AS nextAt, runs, failures FROM job ORDER BY name`,
    );
  }

  /** Keeps a run that ended well. */
  async ended(job: Job, startedAt: number, endedAt: number, result: string): Promise<void> {
    await this.keep(job, startedAt, endedAt, result, 0);
  }

  /** Keeps a run that failed, with its message. */
  async failed(job: Job, startedAt: number, endedAt: number, error: unknown): Promise<void> {
    const message = error instanceof Error ? error.message : String(error);
    await this.keep(job, startedAt, endedAt, `failed: ${message}`, 1);
  }

  private async keep(
    job: Job,
    startedAt: number,
    endedAt: number,
    result: string,
    failures: number,
  ): Promise<void> {
    await this.sql.run(
      `INSERT INTO job (name, last_started_at, last_ended_at, last_result, next_at, runs, failures)
       VALUES ($name, $startedAt, $endedAt, $result, $nextAt, 1, $failures)
       ON CONFLICT (name) DO UPDATE SET last_started_at = excluded.last_started_at, last_ended_at = excluded.last_ended_at,
         last_result = excluded.last_result, next_at = excluded.next_at, runs = runs + 1, failures = failures + excluded.failures`,
      { name: job.name, startedAt, endedAt, result, nextAt: startedAt + job.everySeconds, failures },
    );
  }
}

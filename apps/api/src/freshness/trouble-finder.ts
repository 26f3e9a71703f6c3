import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { aheadS } from '../towers/time-keeping/interval-end';
import { clockShifts, type Arrival } from './clock-shift';
import type { TroubleKind } from './dto/trouble.dto';
import { lateAfterS, SILENT_S } from './limits';
import { CURES, minuteUtc, span } from './trouble-words';

/** What is wrong with a tower now. */
export interface FoundTrouble {
  readonly towerId: number;
  readonly kind: TroubleKind;
  /** UTC epoch seconds. */
  readonly since: number;
  readonly text: string;
}

interface TowerRow {
  id: number;
  name: string;
  intervalS: number;
  staleLimitS: number | null;
  createdAt: number;
}

/** Rows from ahead of the clock that came in within this time tell of a wrong clock, s. */
const AHEAD_WITHIN_S = 3 * 3600;
const AHEAD_ROWS = 3;
const SHIFT_WITHIN_S = 36 * 3600;
const ARRIVALS = 500;
/** A source that failed so often in a row, and for so long, fails: s. */
const FAILURES = 3;
const FAILING_S = 10 * 60;

const TOWERS = `SELECT id, name, interval_s intervalS, stale_limit_s staleLimitS, created_at createdAt
  FROM tower WHERE retired_at IS NULL ORDER BY id`;
/** A reading from the future is none: it must not make a tower look fresh. */
const NEWEST = `SELECT max(t) t FROM (SELECT (SELECT max(t_end) FROM reading r WHERE r.sensor_id = s.id AND r.t_end <= $2) t
  FROM sensor s WHERE s.tower_id = $1)`;
const AHEAD = `SELECT count(*) n, min(i.received_at) since, max(r.text) example FROM import i JOIN refused_row r ON r.import_id = i.id
  WHERE i.tower_id = $1 AND i.received_at >= $2 AND i.origin IN ('push', 'folder', 'http') AND r.code = 'time-ahead'`;
const CAME_IN = `SELECT i.received_at receivedAt, max(s.t1) newestT FROM import i JOIN import_span s ON s.import_id = i.id
  WHERE i.tower_id = $1 AND i.received_at >= $2 AND i.origin IN ('push', 'folder', 'http') AND i.state <> 'withdrawn'
  GROUP BY i.id ORDER BY i.id DESC LIMIT ${ARRIVALS}`;
const FAILING = `SELECT id, kind, coalesce(failing_since, last_at) since, last_result said FROM source
  WHERE tower_id = $1 AND retired_at IS NULL AND failures >= ${FAILURES} AND coalesce(failing_since, last_at) <= $2
  ORDER BY 3 LIMIT 1`;

/** Finds what is wrong with the data of each tower in use. */
@Injectable()
export class TroubleFinder {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** Everything that is wrong now; at most one of a kind for a tower. */
  async find(): Promise<FoundTrouble[]> {
    const found: FoundTrouble[] = [];
    for (const tower of await this.sql.all<TowerRow>(TOWERS)) {
      for (const trouble of [
        await this.unheard(tower),
        await this.ahead(tower),
        await this.shifted(tower),
        await this.failing(tower),
      ])
        if (trouble) found.push({ towerId: tower.id, ...trouble });
    }
    return found;
  }

  private async unheard(tower: TowerRow): Promise<Omit<FoundTrouble, 'towerId'> | undefined> {
    const now = this.clock.now();
    const row = await this.sql.get<{ t: number | null }>(NEWEST, [tower.id, now + aheadS(tower.intervalS)]);
    const newest = row?.t ?? null;
    if (newest === null)
      return now - tower.createdAt < SILENT_S
        ? undefined
        : say('silent', tower.createdAt, `${tower.name} has never given a reading since it was added.`);
    const age = now - newest;
    if (age <= lateAfterS(tower)) return undefined;
    const last = `its last reading is of ${minuteUtc(newest)}`;
    return age < Math.max(SILENT_S, 2 * lateAfterS(tower))
      ? say('late', newest, `${tower.name} is late: ${last}, and its limit is ${span(lateAfterS(tower))}.`)
      : say('silent', newest, `${tower.name} is silent: ${last}.`);
  }

  private async ahead(tower: TowerRow): Promise<Omit<FoundTrouble, 'towerId'> | undefined> {
    const within = Math.max(AHEAD_WITHIN_S, 3 * tower.intervalS);
    const row = await this.sql.get<{ n: number; since: number | null; example: string | null }>(AHEAD, [
      ...[tower.id, this.clock.now() - within],
    ]);
    if (!row?.since || row.n < AHEAD_ROWS) return undefined;
    const [, what = ''] = /(the time .+? in the future)/.exec(row.example ?? '') ?? [];
    return say(
      'clock ahead',
      row.since,
      `${tower.name} sends readings from the future (${what}); they are refused and count for nothing.`,
    );
  }

  private async shifted(tower: TowerRow): Promise<Omit<FoundTrouble, 'towerId'> | undefined> {
    const rows = await this.sql.all<Arrival>(CAME_IN, [tower.id, this.clock.now() - SHIFT_WITHIN_S]);
    const shifts = clockShifts(rows.reverse(), tower.intervalS);
    const newest = shifts.at(-1);
    if (!newest || shifts.reduce((sum, { hours }) => sum + hours, 0) === 0) return undefined;
    const way = newest.hours > 0 ? 'ahead of' : 'behind';
    return say(
      'clock shifted',
      newest.at,
      `The times that ${tower.name} sends are exactly an hour ${way} where they were, since ${minuteUtc(newest.at)}.`,
    );
  }

  private async failing({ id, name }: TowerRow): Promise<Omit<FoundTrouble, 'towerId'> | undefined> {
    const row = await this.sql.get<{ kind: string; since: number; said: string | null }>(FAILING, [
      ...[id, this.clock.now() - FAILING_S],
    ]);
    if (!row) return undefined;
    const said = row.said ? `: ${row.said.replace(/\.?$/, '.')}` : '.';
    return say(
      'source failing',
      row.since,
      `The ${row.kind} source of ${name} has failed since ${minuteUtc(row.since)}${said}`,
    );
  }
}

const say = (kind: TroubleKind, since: number, what: string) => ({
  ...{ kind, since },
  text: `${what} ${CURES[kind]}`,
});

import { Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { qualityCodes } from '@lidwatch/contracts';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { DirtyStages } from '../database/dirty';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { ReworkService } from '../rework/rework.service';
import { blockEndOf } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import type { ImportDto } from './dto/import.dto';
import type { SensorSpan } from './importing/import-store';
import { ImportsService } from './imports.service';

/** Readings of one transaction. */
const AT_ONCE = 20_000;

const HELD = `SELECT t_end FROM reading WHERE sensor_id = $1 AND t_end > $2 AND t_end <= $3 AND import_id = $4
  ORDER BY t_end LIMIT $5`;
const KEEP_PAST = `INSERT INTO reading_past (sensor_id, t_end, until_at, value, import_id, row_no)
  SELECT r.sensor_id, r.t_end, $3, r.value, r.import_id, r.row_no FROM json_each($2) j
  CROSS JOIN reading r ON r.sensor_id = $1 AND r.t_end = j.value`;
/** The newest former value whose import stands. */
const BEFORE = `SELECT p.seq FROM reading_past p JOIN import i ON i.id = p.import_id
  WHERE p.sensor_id = reading.sensor_id AND p.t_end = reading.t_end AND i.withdrawn_at IS NULL ORDER BY p.seq DESC LIMIT 1`;
const RESTORE = `UPDATE reading SET (value, import_id, row_no, quality, checks) =
    (SELECT value, import_id, row_no, 0, 0 FROM reading_past WHERE seq = (${BEFORE}))
  WHERE sensor_id = $1 AND t_end IN (SELECT value FROM json_each($2)) AND EXISTS (${BEFORE})`;
const DROP = `DELETE FROM reading WHERE sensor_id = $1 AND t_end IN (SELECT value FROM json_each($2)) AND import_id = $3`;

/** Blocks that hold no reading any more are not valid; the screening only looks at readings that are there. */
const EMPTY = `UPDATE block_mean SET mean = NULL, n = 0, quality = $4
  WHERE sensor_id = $1 AND t_end IN (SELECT value FROM json_each($2)) AND NOT EXISTS (SELECT 1 FROM reading r
    WHERE r.sensor_id = $1 AND r.t_end > block_mean.t_end - $3 AND r.t_end <= block_mean.t_end)`;

/** Takes imports back as a whole: what they brought is no longer in force, and stays on the record. */
@Injectable()
export class WithdrawalsService implements OnApplicationBootstrap {
  constructor(
    private readonly sql: Sql,
    private readonly imports: ImportsService,
    private readonly layouts: TowerLayouts,
    private readonly dirty: DirtyStages,
    private readonly rework: ReworkService,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
  ) {}

  /** Goes on with what a former process left in the middle. */
  async onApplicationBootstrap(): Promise<void> {
    const left = await this.sql.all<{ id: number }>(
      `SELECT id FROM import WHERE withdrawn_at IS NOT NULL AND state <> 'withdrawn' ORDER BY id`,
    );
    for (const { id } of left) await this.takeBack(await this.imports.get(id), null);
  }

  /**
   * Takes an import back. Where it had put another value in force, the newest value of an import that stands comes into
   * force again; where there was none, the reading is gone. What depends on it is worked out anew.
   */
  async withdraw(id: number, reason: string, by: SignedIn): Promise<ImportDto> {
    const found = await this.imports.get(id);
    await this.work.run(async () => {
      const changed = await this.sql.run(
        `UPDATE import SET withdrawn_at = $2, withdrawn_by = $3
         WHERE id = $1 AND withdrawn_at IS NULL AND state IN ('done', 'cancelled', 'failed')`,
        [id, this.clock.now(), by.id],
      );
      if (changed === 0) throw await this.whyNot(id);
      const body = { import: id, name: found.name, reason };
      const subject = `tower ${found.towerId}`;
      await this.activity.record({ actor: by, act: 'import undone', subject, body });
    });
    await this.takeBack(found, by.id);
    return this.imports.get(id);
  }

  private async whyNot(id: number): Promise<Problem> {
    const { name, state, withdrawnAt, withdrawnBy } = await this.imports.get(id);
    return state === 'running'
      ? new Problem('not-possible-now', `"${name}" is still being imported. Cancel it first, then undo it.`)
      : new Problem(
          'already-done',
          `Already undone by ${withdrawnBy ?? 'the service'} at ${withdrawnAt ?? toIso(0)}.`,
        );
  }

  private async takeBack({ id, towerId, name }: ImportDto, byUser: number | null): Promise<void> {
    const spans = await this.sql.all<SensorSpan>(
      'SELECT sensor_id sensorId, t0, t1 FROM import_span WHERE import_id = $1',
      [id],
    );
    const { blockS } = await this.layouts.of(towerId);
    const prepared = await this.prepare({ towerId, name, byUser, blockS }, spans);
    const marked = new Set<number>();
    for (const span of spans) {
      let after = span.t0 - 1;
      for (;;) {
        const taken = await this.work.run(
          () => this.takeSome(id, towerId, blockS, { ...span, t0: after }),
          'bulk',
        );
        if (taken === undefined) break;
        taken.blocks.forEach((t) => marked.add(t));
        after = taken.last;
      }
    }
    await this.work.run(async () => {
      await this.sql.run(`UPDATE import SET state = 'withdrawn' WHERE id = $1`, [id]);
      if (prepared !== null) await this.rework.follow(prepared, marked.size);
    }, 'bulk');
  }

  /** Keeps how the findings are before anything is taken back; null where nothing was brought. */
  private async prepare(
    {
      towerId,
      name,
      byUser,
      blockS,
    }: { towerId: number; name: string; byUser: number | null; blockS: number },
    spans: readonly SensorSpan[],
  ): Promise<number | null> {
    if (spans.length === 0) return null;
    const first = blockEndOf(Math.min(...spans.map(({ t0 }) => t0)), blockS) - blockS;
    const last = blockEndOf(Math.max(...spans.map(({ t1 }) => t1)), blockS);
    const cause = `Import of "${name}" undone`;
    return this.rework.prepare({
      ...{ towerId, cause, t0: first, t1: last },
      ...(byUser !== null && { byUser }),
    });
  }

  /** Takes the next readings of one sensor back; gives the last instant and the blocks, or nothing where none is left. */
  private async takeSome(
    importId: number,
    towerId: number,
    blockS: number,
    { sensorId, t0, t1 }: SensorSpan,
  ): Promise<{ last: number; blocks: readonly number[] } | undefined> {
    const rows = await this.sql.all<{ t_end: number }>(HELD, [sensorId, t0, t1, importId, AT_ONCE]);
    if (rows.length === 0) return undefined;
    const instants = rows.map((row) => row.t_end);
    const list = JSON.stringify(instants);
    await this.sql.run(KEEP_PAST, [sensorId, list, this.clock.now()]);
    await this.sql.run(RESTORE, [sensorId, list]);
    await this.sql.run(DROP, [sensorId, list, importId]);
    const blocks = [...new Set(instants.map((t) => blockEndOf(t, blockS)))];
    await this.sql.run(EMPTY, [sensorId, JSON.stringify(blocks), blockS, qualityCodes.missing]);
    const marks = blocks.map((t) => [towerId, t] as const);
    await this.dirty.markRead(marks);
    await this.dirty.mark(2, marks);
    return { last: instants.at(-1)!, blocks };
  }
}

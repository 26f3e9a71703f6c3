import { Injectable } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { invalid } from '../common/validation';
import { DirtyStages } from '../database/dirty';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { ReworkService } from '../rework/rework.service';
import { blockEndOf } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import type { OverrideDto, OverrideInput } from './dto/override.dto';

interface OverrideRow extends Omit<OverrideDto, 'from' | 'to' | 'at' | 'undoneAt'> {
  readonly towerId: number;
  readonly t0: number;
  readonly t1: number;
  readonly at: number;
  readonly undoneAt: number | null;
}

const SELECT = `SELECT o.id, o.sensor_id sensorId, s.name sensorName, s.tower_id towerId, o.t0, o.t1, o.quality, o.reason,
    u.name "by", o.at, v.name undoneBy, o.undone_at undoneAt
  FROM override o JOIN sensor s ON s.id = o.sensor_id JOIN user u ON u.id = o.by_user LEFT JOIN user v ON v.id = o.undone_by`;
const INSERT = `WITH one AS (SELECT 1) INSERT INTO override (sensor_id, t0, t1, quality, reason, by_user, at)
  SELECT $1, $2, $3, $4, $5, $6, $7 FROM one RETURNING id`;

const seconds = (iso: string): number => Math.floor(Date.parse(iso) / 1000);

const show = ({ towerId: _, t0, t1, at, undoneAt, ...row }: OverrideRow): OverrideDto => ({
  ...row,
  from: toIso(t0),
  to: toIso(t1),
  at: toIso(at),
  undoneAt: undoneAt === null ? null : toIso(undoneAt),
});

/** Spans of sensors that people set valid or failed; their word wins over every check, and stays on the record. */
@Injectable()
export class OverridesService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
    private readonly dirty: DirtyStages,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
    private readonly reworks: ReworkService,
  ) {}

  /** A tower's set spans, the newest first, undone ones too. */
  async list(towerId: number): Promise<OverrideDto[]> {
    const rows = await this.sql.all<OverrideRow>(
      `${SELECT} WHERE s.tower_id = $1 ORDER BY o.id DESC LIMIT 1000`,
      [towerId],
    );
    return rows.map(show);
  }

  /** Sets a span of a sensor; what depends on it is worked out anew. */
  set(input: OverrideInput, by: SignedIn): Promise<OverrideDto> {
    const [t0, t1] = [seconds(input.from), seconds(input.to)];
    if (t1 < t0) throw invalid([{ field: 'to', text: 'The span ends before it begins: exchange the two.' }]);
    return this.work.run(async () => {
      const sensor = await this.sql.get<{ towerId: number; name: string }>(
        'SELECT tower_id towerId, name FROM sensor WHERE id = $1',
        [input.sensorId],
      );
      if (!sensor) throw invalid([{ field: 'sensorId', text: `There is no sensor ${input.sensorId}.` }]);
      const values = [input.sensorId, t0, t1, input.quality, input.reason, by.id, this.clock.now()];
      const [made] = await this.sql.returning<{ id: number }>(INSERT, values);
      const done = input.quality === 'failed' ? 'set aside' : 'set right';
      await this.workOutAnew(sensor.towerId, t0, t1, by, `${sensor.name} ${done}: ${input.reason}`);
      await this.record(`set readings ${input.quality}`, sensor.towerId, by, input);
      return show(await this.find(made!.id));
    });
  }

  /** Undoes a set span; it stays on the record, marked undone. */
  undo(id: number, by: SignedIn): Promise<OverrideDto> {
    return this.work.run(async () => {
      const row = await this.find(id);
      if (row.undoneAt !== null) {
        throw new Problem('already-done', `Already undone by ${row.undoneBy} at ${toIso(row.undoneAt)}.`);
      }
      await this.sql.run('UPDATE override SET undone_by = $2, undone_at = $3 WHERE id = $1', [
        ...[id, by.id, this.clock.now()],
      ]);
      const done = row.quality === 'failed' ? 'setting aside' : 'setting right';
      await this.workOutAnew(row.towerId, row.t0, row.t1, by, `${row.sensorName}: ${done} undone`);
      await this.record('undid a set span', row.towerId, by, { id });
      return show(await this.find(id));
    });
  }

  private async find(id: number): Promise<OverrideRow> {
    const row = await this.sql.get<OverrideRow>(`${SELECT} WHERE o.id = $1`, [id]);
    if (!row) throw new Problem('not-found', `There is no set span ${id}.`);
    return row;
  }

  private async workOutAnew(
    towerId: number,
    t0: number,
    t1: number,
    by: SignedIn,
    cause: string,
  ): Promise<void> {
    const { blockS } = await this.layouts.of(towerId);
    const span = { t0: t0 - 1, t1: blockEndOf(t1, blockS) };
    await this.dirty.markTower(towerId, span.t0, span.t1);
    await this.reworks.begin({ towerId, cause, byUser: by.id, ...span });
  }

  private record(act: string, towerId: number, by: SignedIn, body: object): Promise<void> {
    return this.activity.record({ actor: by, act, subject: `tower ${towerId}`, body });
  }
}

import { Injectable } from '@nestjs/common';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { openUnit } from '../database/unit-context';
import { UnitOfWork } from '../database/unit-of-work';
import type { LayoutSensor, LayoutVersion, TowerLayout } from './tower-layout';

type TowerRow = Omit<TowerLayout, 'sensors' | 'reportOnly' | 'neighbourIds'> & {
  readonly screening: string;
  readonly neighbours: string;
};
type SensorRow = Omit<LayoutSensor, 'limits' | 'versions'> & {
  readonly limits: string | null;
  readonly versions: string;
};

const TOWER = `SELECT id, name, elevation_m elevationM, latitude, longitude, interval_s intervalS, block_s blockS, clock, stamp, screening,
  inversion_form inversionForm, embed_depth_m embedDepthM, retired_at retiredAt,
  (SELECT json_group_array(neighbour_id) FROM tower_neighbour WHERE tower_id = tower.id) neighbours
  FROM tower WHERE id = $1`;
const SENSORS = `SELECT id, name, quantity, retired_at retiredAt, screening_limits limits,
  (SELECT json_group_array(json_object('fromT', from_t, 'heightM', height_m, 'offset', "offset", 'gain', gain,
    'sigma', sigma, 'pairSigma', pair_sigma)) FROM sensor_version v WHERE v.sensor_id = s.id) versions
  FROM sensor s WHERE tower_id = $1 ORDER BY id`;

const sensorOf = ({ limits, versions, ...row }: SensorRow): LayoutSensor => ({
  ...row,
  limits: limits === null ? {} : (JSON.parse(limits) as Record<string, number>),
  versions: (JSON.parse(versions) as LayoutVersion[]).sort((a, b) => a.fromT - b.fromT),
});

/** The towers' layouts, kept in memory: every reading needs one, and one process owns the store. */
@Injectable()
export class TowerLayouts {
  private readonly kept = new Map<number, TowerLayout>();

  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
  ) {}

  /** A tower's layout; 404 without the tower. */
  async of(towerId: number): Promise<TowerLayout> {
    const kept = this.kept.get(towerId);
    if (kept) return kept;
    const row = await this.sql.get<TowerRow>(TOWER, [towerId]);
    if (!row) throw new Problem('not-found', `There is no tower ${towerId}.`);
    const { screening, neighbours, ...tower } = row;
    const sensors = await this.sql.all<SensorRow>(SENSORS, [towerId]);
    const layout = {
      ...{ ...tower, reportOnly: screening === 'report-only', sensors: sensors.map(sensorOf) },
      neighbourIds: JSON.parse(neighbours) as number[],
    };
    // What a transaction has not committed yet may never be true.
    if (!openUnit()) this.kept.set(towerId, layout);
    return layout;
  }

  /** Forgets a tower's layout at once and again after the running transaction, whichever way it ends. */
  forget(towerId: number): void {
    this.kept.delete(towerId);
    this.work.afterCommit(() => this.kept.delete(towerId));
  }
}

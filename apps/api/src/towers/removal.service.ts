import { Injectable } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { TowerLayouts } from './tower-layouts';

const HAS_READINGS = `SELECT 1 FROM reading WHERE sensor_id IN (SELECT value FROM json_each($1)) LIMIT 1`;
const HAD_READINGS = `SELECT 1 FROM reading_past WHERE sensor_id IN (SELECT value FROM json_each($1)) LIMIT 1`;
const DISTRICT = `SELECT name FROM district d WHERE floor_tower_id = $1 OR bench_tower_id = $1 OR pm25_tower_id = $1
  OR EXISTS (SELECT 1 FROM district_tower t WHERE t.district_id = d.id AND t.tower_id = $1) LIMIT 1`;
/** All that belongs to a tower without readings, from what points to what is pointed at. */
const OF_TOWER = [
  'DELETE FROM source_file WHERE source_id IN (SELECT id FROM source WHERE tower_id = $1)',
  'DELETE FROM source WHERE tower_id = $1',
  'DELETE FROM ingest_key WHERE tower_id = $1',
  'DELETE FROM tower_mapping WHERE tower_id = $1',
  'DELETE FROM tower_trouble WHERE tower_id = $1',
  'DELETE FROM rework WHERE tower_id = $1',
  'DELETE FROM dirty WHERE stage IN (1, 2) AND subject = $1',
  'DELETE FROM tower_neighbour WHERE $1 IN (tower_id, neighbour_id)',
  'DELETE FROM sensor_version WHERE sensor_id IN (SELECT id FROM sensor WHERE tower_id = $1)',
  'DELETE FROM sensor WHERE tower_id = $1',
  'DELETE FROM tower WHERE id = $1',
];

/** Takes away towers and sensors made by mistake. What ever had a reading stays, and can be retired. */
@Injectable()
export class RemovalService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly activity: ActivityService,
  ) {}

  /** Takes a tower away that has no readings and that no district asks. */
  tower(id: number, by: SignedIn): Promise<void> {
    return this.work.run(async () => {
      const { name, sensors } = await this.layouts.of(id);
      await this.refuseWithReadings(
        name,
        sensors.map((sensor) => sensor.id),
      );
      const district = await this.sql.get<{ name: string }>(DISTRICT, [id]);
      if (district) {
        throw new Problem(
          'not-possible-now',
          `${district.name} asks ${name}. Take it out of the district first, or retire it.`,
        );
      }
      const came = await this.sql.get(
        'SELECT 1 FROM import WHERE tower_id = $1 UNION ALL SELECT 1 FROM upload WHERE tower_id = $1',
        [id],
      );
      if (came) {
        throw new Problem(
          'not-possible-now',
          `Files came in for ${name}; they stay on the record. Retire the tower instead.`,
        );
      }
      const near = await this.sql.all<{ id: number }>(
        'SELECT tower_id id FROM tower_neighbour WHERE neighbour_id = $1',
        [id],
      );
      for (const statement of OF_TOWER) await this.sql.run(statement, [id]);
      for (const tower of [id, ...near.map((each) => each.id)]) this.layouts.forget(tower);
      await this.activity.record({ actor: by, act: 'tower deleted', subject: `tower ${id}`, body: { name } });
    });
  }

  /** Takes a sensor away that has no readings. */
  sensor(id: number, by: SignedIn): Promise<void> {
    return this.work.run(async () => {
      const found = await this.sql.get<{ name: string; towerId: number }>(
        'SELECT name, tower_id towerId FROM sensor WHERE id = $1',
        [id],
      );
      if (!found) throw new Problem('not-found', `There is no sensor ${id}.`);
      const { name, towerId } = found;
      await this.refuseWithReadings(name, [id]);
      const set = await this.sql.get('SELECT 1 FROM override WHERE sensor_id = $1', [id]);
      if (set)
        throw new Problem(
          'not-possible-now',
          `Spans of ${name} were set; they stay on the record. Retire the sensor instead.`,
        );
      await this.sql.run('DELETE FROM sensor_version WHERE sensor_id = $1', [id]);
      await this.sql.run('DELETE FROM sensor WHERE id = $1', [id]);
      this.layouts.forget(towerId);
      await this.activity.record({
        actor: by,
        act: 'sensor deleted',
        subject: `tower ${towerId}`,
        body: { sensor: name },
      });
    });
  }

  private async refuseWithReadings(name: string, sensorIds: readonly number[]): Promise<void> {
    const ids = JSON.stringify(sensorIds);
    if (!(await this.sql.get(HAS_READINGS, [ids])) && !(await this.sql.get(HAD_READINGS, [ids]))) return;
    throw new Problem(
      'not-possible-now',
      `${name} has readings, and they are kept for ever. Retire it instead: nothing new is taken, and its past stays.`,
    );
  }
}

import { Injectable } from '@nestjs/common';
import { invalid } from '../common/validation';
import { Sql } from '../database/sql';

/** A district as an account names it. */
export interface DistrictBrief {
  id: number;
  slug: string;
  name: string;
}

/** Which districts are whose. */
@Injectable()
export class UserDistricts {
  constructor(private readonly sql: Sql) {}

  /** The districts of one person, by name. */
  async of(userId: number): Promise<DistrictBrief[]> {
    return this.sql.all<DistrictBrief>(
      `SELECT id, slug, name FROM district WHERE id IN (SELECT district_id FROM user_district WHERE user_id = $1) ORDER BY name`,
      [userId],
    );
  }

  /** Every district, by name. */
  all(): Promise<DistrictBrief[]> {
    return this.sql.all<DistrictBrief>('SELECT id, slug, name FROM district ORDER BY name');
  }

  /** The districts of everybody who has some. */
  async byUser(): Promise<Map<number, number[]>> {
    const rows = await this.sql.all<{ userId: number; districtIds: string }>(
      'SELECT user_id AS userId, json_group_array(district_id) AS districtIds FROM user_district GROUP BY user_id',
    );
    return new Map(rows.map(({ userId, districtIds }) => [userId, JSON.parse(districtIds) as number[]]));
  }

  /** Gives a person exactly these districts; throws 422 for one that does not exist. */
  async set(userId: number, districtIds: number[]): Promise<void> {
    const known = new Set((await this.all()).map(({ id }) => id));
    const unknown = districtIds.find((id) => !known.has(id));
    if (unknown !== undefined)
      throw invalid([{ field: 'districtIds', text: `There is no district ${unknown}.` }]);
    await this.sql.run('DELETE FROM user_district WHERE user_id = $1', [userId]);
    await this.sql.run(
      'INSERT INTO user_district (user_id, district_id) SELECT $1, value FROM json_each($2)',
      [userId, JSON.stringify(districtIds)],
    );
  }
}

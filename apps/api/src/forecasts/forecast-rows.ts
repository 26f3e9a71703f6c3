import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';

/** What a forecast says; null: it says nothing of it. */
export interface ForecastSays {
  readonly highC: number | null;
  readonly lowC: number | null;
  readonly cloudPercent: number | null;
  readonly windMPerS: number | null;
  readonly mixingHeightM: number | null;
}

/** A forecast as it was entered; instants in UTC epoch seconds. */
export interface StoredForecast extends ForecastSays {
  readonly id: number;
  readonly districtId: number;
  /** The day whose evening it begins with. */
  readonly forDay: string;
  readonly note: string;
  readonly origin: 'entered' | 'uploaded' | 'demo';
  readonly enteredAt: number;
  readonly by: string | null;
}

/** What a forecast's night and day turned out to be. */
export interface StoredOutcome {
  readonly districtId: number;
  readonly forDay: string;
  readonly towerId: number;
  readonly highC: number | null;
  readonly lowC: number | null;
  readonly windMPerS: number | null;
  readonly mixingLo: number | null;
  readonly mixingHi: number | null;
  readonly hours: number;
  readonly keptAt: number;
}

const SELECT = `SELECT f.id, f.district_id districtId, f.for_day forDay, f.high_c highC, f.low_c lowC, f.cloud_percent cloudPercent,
    f.wind_m_per_s windMPerS, f.mixing_height_m mixingHeightM, f.note, f.origin, f.entered_at enteredAt, u.name "by"
  FROM forecast f LEFT JOIN user u ON u.id = f.by_user`;
const INSERT = `WITH one AS (SELECT 1) INSERT INTO forecast (district_id, for_day, high_c, low_c, cloud_percent, wind_m_per_s,
    mixing_height_m, note, origin, entered_at, by_user)
  SELECT $1, $2, $3, $4, $5, $6, $7, $8, $9, $10, $11 FROM one RETURNING id`;
const OUTCOMES = `SELECT district_id districtId, for_day forDay, tower_id towerId, high_c highC, low_c lowC, wind_m_per_s windMPerS,
    mixing_height_lo mixingLo, mixing_height_hi mixingHi, hours, kept_at keptAt
  FROM forecast_outcome WHERE district_id = $1 AND for_day >= $2 AND for_day <= $3`;
const KEEP = `INSERT INTO forecast_outcome (district_id, for_day, tower_id, high_c, low_c, wind_m_per_s, mixing_height_lo,
    mixing_height_hi, hours, kept_at) VALUES ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10)
  ON CONFLICT DO UPDATE SET tower_id = excluded.tower_id, high_c = excluded.high_c, low_c = excluded.low_c,
    wind_m_per_s = excluded.wind_m_per_s, mixing_height_lo = excluded.mixing_height_lo,
    mixing_height_hi = excluded.mixing_height_hi, hours = excluded.hours, kept_at = excluded.kept_at`;

/** The forecasts' rows; each entry stays, the newest counts. */
@Injectable()
export class ForecastRows {
  constructor(private readonly sql: Sql) {}

  /** Entries for days of a span, both ends included, of some districts, the oldest first. */
  between(districtIds: readonly number[], from: string, to: string): Promise<StoredForecast[]> {
    return this.sql.all<StoredForecast>(
      `${SELECT} WHERE f.district_id IN (SELECT value FROM json_each($1)) AND f.for_day >= $2 AND f.for_day <= $3 ORDER BY f.id`,
      [JSON.stringify(districtIds), from, to],
    );
  }

  /** One entry. */
  async find(id: number): Promise<StoredForecast> {
    return (await this.sql.get<StoredForecast>(`${SELECT} WHERE f.id = $1`, [id]))!;
  }

  /** Keeps an entry and gives its id. */
  async add(
    entry: ForecastSays & Pick<StoredForecast, 'districtId' | 'forDay' | 'note' | 'origin' | 'enteredAt'>,
    byUser: number | null,
  ): Promise<number> {
    const { districtId, forDay, highC, lowC, cloudPercent, windMPerS, mixingHeightM } = entry;
    const [made] = await this.sql.returning<{ id: number }>(INSERT, [
      ...[districtId, forDay, highC, lowC, cloudPercent, windMPerS, mixingHeightM],
      ...[entry.note, entry.origin, entry.enteredAt, byUser],
    ]);
    return made!.id;
  }

  /** What days of a span turned out to be. */
  outcomes(districtId: number, from: string, to: string): Promise<StoredOutcome[]> {
    return this.sql.all<StoredOutcome>(OUTCOMES, [districtId, from, to]);
  }

  /** Keeps what a day turned out to be, in place of what was kept before. */
  async keepOutcome(outcome: StoredOutcome): Promise<void> {
    const { districtId, forDay, towerId, highC, lowC, windMPerS, mixingLo, mixingHi, hours, keptAt } =
      outcome;
    await this.sql.run(KEEP, [
      ...[districtId, forDay, towerId, highC, lowC, windMPerS, mixingLo, mixingHi, hours, keptAt],
    ]);
  }
}

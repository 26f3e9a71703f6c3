import { checkBits, checkNames, qualityCodes, qualityName } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { offsetOf } from '../common/paging';
import { Sql } from '../database/sql';
import { TowerLayouts } from '../towers/tower-layouts';
import { askedSpan } from './asked-span';
import { checkWords } from './check-words';
import type { FlaggedSpanPage } from './dto/flags.dto';
import type { FlagsQuery } from './dto/seen-query.dto';
import { sensorsOf } from './seen-sensors';

const MOST_DAYS = 400;
/** Readings further apart than so many intervals do not belong together, as in screening. */
const TOGETHER_INTERVALS = 2.5;

interface SpanRow {
  readonly sensorId: number;
  readonly bit: number;
  readonly t0: number;
  readonly t1: number;
  readonly readings: number;
  readonly quality: number;
  readonly setBy: string | null;
  readonly total: number;
}

/* What a person's word holds for is a span of its own, for its quality is another. */
const SPANS = `WITH flagged AS (
    SELECT r.sensor_id, r.t_end, r.quality, b.value bit, (r.checks & ${checkBits.override}) <> 0 held
    FROM json_each($sensors) s CROSS JOIN reading r INDEXED BY reading_flagged
      ON r.sensor_id = s.value AND r.t_end > $t0 AND r.t_end <= $t1 AND r.checks <> 0
    CROSS JOIN json_each($bits) b WHERE r.checks & b.value),
  begun AS (SELECT *, coalesce(t_end - lag(t_end) OVER own > $gap, 1) begins FROM flagged
    WINDOW own AS (PARTITION BY sensor_id, bit, held ORDER BY t_end)),
  numbered AS (SELECT *, sum(begins) OVER (PARTITION BY sensor_id, bit, held ORDER BY t_end) span FROM begun),
  spans AS (SELECT sensor_id, bit, held, min(t_end) t0, max(t_end) t1, count(*) readings, max(quality) quality,
      count(*) OVER () total
    FROM numbered GROUP BY sensor_id, bit, held, span
    HAVING $worst IS NULL OR max(quality) = $worst ORDER BY t1 DESC, t0 DESC, sensor_id, bit LIMIT $limit OFFSET $offset)
  SELECT sensor_id sensorId, bit, t0, t1, readings, quality, total,
    CASE WHEN held THEN (SELECT u.name FROM override o JOIN user u ON u.id = o.by_user
      WHERE o.sensor_id = spans.sensor_id AND o.undone_at IS NULL AND o.t0 <= spans.t0 AND o.t1 >= spans.t0
      ORDER BY o.at DESC, o.id DESC LIMIT 1) END setBy
  FROM spans ORDER BY t1 DESC, t0 DESC, sensor_id, bit`;

/** Every check; what people set has a list of its own. */
const CHECKS = Object.values(checkBits).filter((bit) => bit !== checkBits.override);

/** Readings that checks spoke of, as spans. */
@Injectable()
export class FlagsService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
  ) {}

  /** The flagged spans of a tower, the newest first. */
  async of(towerId: number, query: FlagsQuery): Promise<FlaggedSpanPage> {
    const { t0, t1 } = askedSpan(query, MOST_DAYS);
    const tower = await this.layouts.of(towerId);
    const sensors = sensorsOf(tower, query.sensorId);
    const { page, pageSize, check } = query;
    const rows = await this.sql.all<SpanRow>(SPANS, {
      ...{ t0, t1, gap: TOGETHER_INTERVALS * tower.intervalS, limit: pageSize, offset: offsetOf(query) },
      sensors: JSON.stringify(sensors.map(({ id }) => id)),
      worst: query.quality ? qualityCodes[query.quality] : null,
      bits: JSON.stringify(check ? [checkBits[check]] : CHECKS),
    });
    const items = rows.map((row) => {
      const sensor = sensors.find(({ id }) => id === row.sensorId)!;
      const [found] = checkNames(row.bit);
      const quality = qualityName(row.quality);
      return {
        ...{ sensorId: sensor.id, sensorName: sensor.name, check: found!, quality },
        says: checkWords(found!, sensor, quality),
        ...{ from: toIso(row.t0), to: toIso(row.t1), readings: row.readings, setBy: row.setBy },
      };
    });
    return { items, total: rows[0]?.total ?? 0, page, pageSize };
  }
}

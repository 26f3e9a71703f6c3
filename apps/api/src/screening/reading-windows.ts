import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { Series, SetSpan, Stretch } from './series';

/** A stretch of one sensor's readings. */
export interface Wanted extends Stretch {
  readonly sensorId: number;
}

interface Row {
  readonly key: number;
  readonly t: string;
  readonly v: string;
  readonly flags: string;
}

/*
 * Readings come as one text per series: a row object per reading costs four times as much. 17 digits keep a value
 * whole; JSON functions would cut it to 15. Qualities go from 0 to 3.
 */
const WINDOWS = `SELECT j.key, group_concat(r.t_end) t, group_concat(format('%!.17g', r.value)) v,
    group_concat(r.checks * 4 + r.quality) flags
  FROM json_each($1) j CROSS JOIN reading r
  ON r.sensor_id = j.value->>0 AND r.t_end > j.value->>1 AND r.t_end <= j.value->>2 GROUP BY j.key`;
const SET_SPANS = `SELECT sensor_id sensorId, t0, t1, quality, at FROM override
  WHERE undone_at IS NULL AND sensor_id IN (SELECT value FROM json_each($1)) ORDER BY id`;

const numbers = (text: string): number[] => JSON.parse(`[${text}]`) as number[];

/** Reads stretches of readings and what people have set about them. */
@Injectable()
export class ReadingWindows {
  constructor(private readonly sql: Sql) {}

  /** The readings of each wanted stretch, in the order asked; stretches without readings are empty series. */
  async read(wanted: readonly Wanted[]): Promise<Series[]> {
    const asked = JSON.stringify(wanted.map(({ sensorId, t0, t1 }) => [sensorId, t0, t1]));
    const rows = await this.sql.all<Row>(WINDOWS, [asked]);
    const found = new Map(rows.map((row) => [row.key, row]));
    return wanted.map(({ sensorId }, key) => {
      const row = found.get(key);
      if (!row) return { sensorId, tEnd: [], value: [], quality: [], checks: [] };
      const [tEnd, value, flags] = [numbers(row.t), numbers(row.v), numbers(row.flags)];
      const [quality, checks] = [flags.map((bits) => bits & 3), flags.map((bits) => bits >> 2)];
      return { sensorId, tEnd, value, quality, checks };
    });
  }

  /** The spans that people have set for these sensors and not undone, the oldest first. */
  setSpans(sensorIds: readonly number[]): Promise<SetSpan[]> {
    return this.sql.all<SetSpan>(SET_SPANS, [JSON.stringify(sensorIds)]);
  }
}

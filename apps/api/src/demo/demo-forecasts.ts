import { Injectable } from '@nestjs/common';
import { Clock, SetClock } from '../common/clock';
import { Sql } from '../database/sql';
import { DistrictsService } from '../districts/districts.service';
import { ForecastsService } from '../forecasts/forecasts.service';
import { addDays, localDay, localInstant } from '../forecasts/local-days';
import { draw } from './draw';
import type { DemoStaff } from './demo-office';

const DAY_S = 86_400;
/** Forecasts are entered of the last so many days. */
const LAST_DAYS = 14;
/** The local hour at which the analyst enters them. */
const AT_HOUR = 12.6;

const AIR = `SELECT min(levels->>'$[0][1]') low, max(levels->>'$[0][1]') high, avg(other->>'windSpeedMPerS') wind
  FROM profile WHERE tower_id = $1 AND t_end > $2 AND t_end <= $3`;

const tenth = (value: number): number => Math.round(value * 10) / 10;

/**
 * The analyst's forecasts of the demo's last days: tomorrow will be as today, give or take, which is how forecasts begin
 * where there is no weather service.
 */
@Injectable()
export class DemoForecasts {
  private done = '';

  constructor(
    private readonly forecasts: ForecastsService,
    private readonly districts: DistrictsService,
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** Enters the forecasts that fall before an instant t, under the set clock; `end` is when the history ends. */
  async enterUntil(t: number, end: number, { analyst }: DemoStaff, timeZone: string): Promise<void> {
    if (t < end - LAST_DAYS * DAY_S) return;
    const day = localDay(timeZone, t);
    for (const each of [addDays(day, -1), day]) {
      const at = localInstant(timeZone, each, 0) + AT_HOUR * 3600;
      if (each <= this.done || at > t || at < this.clock.now()) continue;
      this.done = each;
      (this.clock as SetClock).set(at);
      for (const district of await this.districts.list()) {
        const towerId = district.floorTowerId ?? district.towers[0]?.towerId;
        const air = await this.sql.get<Record<'low' | 'high' | 'wind', number | null>>(AIR, [
          towerId,
          at - DAY_S,
          at,
        ]);
        if (air?.low == null || air.high == null) continue;
        const off = (what: string, size: number): number => (draw(what, district.id, each) - 0.5) * 2 * size;
        await this.forecasts.enter(
          {
            ...{ districtId: district.id, day: each },
            ...{ lowC: tenth(air.low + off('low', 2.5)), highC: tenth(air.high + off('high', 2)) },
            cloudPercent: Math.round(draw('cloud', district.id, each) * 10) * 10,
            windMPerS: tenth(Math.max(0, (air.wind ?? 2) + off('wind', 1))),
            mixingHeightM: 100 * Math.round(2 + 6 * draw('mixing', district.id, each)),
          },
          analyst,
          'demo',
        );
      }
    }
  }
}

import { fromMeasured, makeProfile, mixingHeightM, type Quantity } from '@lidwatch/atmosphere';
import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { DistrictsService } from '../districts/districts.service';
import type { DistrictDto } from '../districts/dto/district.dto';
import type { StoredLevel } from '../profiles/block-facts';
import { JobsService } from '../scheduler/jobs.service';
import { TowerLayouts } from '../towers/tower-layouts';
import { ForecastRows, type StoredOutcome } from './forecast-rows';
import { addDays, dayAfter, localDay, localInstant, nightOf, type Stretch } from './local-days';

const HOUR_S = 3600;
/** Days worked out again at each turn, so that readings that came late still count. */
const AGAIN_DAYS = 4;
/** Days looked at: those of them that are not kept yet are worked out, too. */
const LOOKED_AT_DAYS = 40;
/** A mean or an extreme of a stretch counts with so many of its blocks. */
const ENOUGH = 0.75;
/** The profile of this local hour is the one a parcel rises through. */
const MORNING = 6;

const AIR = `SELECT min(levels->>'$[0][1]') low, max(levels->>'$[0][1]') high, count(levels->>'$[0][1]') n,
    avg(other->>'windSpeedMPerS') wind, count(other->>'windSpeedMPerS') windN
  FROM profile WHERE tower_id = $1 AND t_end > $2 AND t_end <= $3`;
const MORNING_LEVELS = `SELECT levels FROM profile WHERE tower_id = $1 AND t_end > $2 AND t_end <= $3 ORDER BY t_end DESC LIMIT 1`;

interface Air {
  readonly low: number | null;
  readonly high: number | null;
  readonly n: number;
  readonly wind: number | null;
  readonly windN: number;
}

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

/** What the nights and days of forecasts turned out to be, from each district's floor tower (or its first). */
@Injectable()
export class OutcomesService implements OnModuleInit {
  constructor(
    private readonly rows: ForecastRows,
    private readonly districts: DistrictsService,
    private readonly layouts: TowerLayouts,
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly jobs: JobsService,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.jobs.register('see how forecasts turned out', HOUR_S, () => this.keepAll());
  }

  /** Works out the days behind that have a forecast, the last of them anew; says how many. */
  async keepAll(): Promise<string> {
    let kept = 0;
    for (const district of await this.districts.list()) {
      const today = localDay(district.timeZone, this.clock.now());
      const span = [addDays(today, -LOOKED_AT_DAYS), addDays(today, -2)] as const;
      const entries = await this.rows.between([district.id], ...span);
      const known = new Set((await this.rows.outcomes(district.id, ...span)).map(({ forDay }) => forDay));
      for (const day of new Set(entries.map(({ forDay }) => forDay))) {
        if (known.has(day) && day < addDays(today, -AGAIN_DAYS)) continue;
        const outcome = await this.workOut(district, day);
        if (!outcome) continue;
        await this.work.run(() => this.rows.keepOutcome(outcome), 'bulk');
        kept += 1;
      }
    }
    return `${kept} days`;
  }

  private async workOut(district: DistrictDto, day: string): Promise<StoredOutcome | undefined> {
    const towerId = district.floorTowerId ?? district.towers[0]?.towerId;
    if (towerId === undefined) return undefined;
    const { blockS } = await this.layouts.of(towerId);
    const night = await this.air(towerId, nightOf(district.timeZone, day));
    const next = dayAfter(district.timeZone, day);
    const after = await this.air(towerId, next);
    const nightS = nightOf(district.timeZone, day);
    const isEnough = (n: number, { from, to }: Stretch): boolean => n >= (ENOUGH * (to - from)) / blockS;
    const highC = isEnough(after.n, next) ? after.high : null;
    const mixing = await this.mixing(
      towerId,
      localInstant(district.timeZone, addDays(day, 1), MORNING),
      highC,
    );
    return {
      ...{ districtId: district.id, forDay: day, towerId, highC },
      lowC: isEnough(night.n, nightS) ? night.low : null,
      windMPerS: isEnough(night.windN, nightS) ? night.wind : null,
      ...{ mixingLo: finite(mixing.lo), mixingHi: finite(mixing.hi) },
      hours: Math.round((night.n * blockS) / HOUR_S),
      keptAt: this.clock.now(),
    };
  }

  private async air(towerId: number, { from, to }: Stretch): Promise<Air> {
    return (await this.sql.get<Air>(AIR, [towerId, from, to]))!;
  }

  /** How high a parcel rises that the day's high warms, through the morning's profile. */
  private async mixing(towerId: number, morning: number, highC: number | null): Promise<Quantity> {
    const row = await this.sql.get<{ levels: string }>(MORNING_LEVELS, [towerId, morning - HOUR_S, morning]);
    const levels = (JSON.parse(row?.levels ?? '[]') as StoredLevel[]).map(
      ([heightM, temperatureC, sigmaC]) => ({
        ...{ heightM, temperatureC, sigmaC },
      }),
    );
    return mixingHeightM(makeProfile(levels), fromMeasured(highC, 'the day was not measured'));
  }
}

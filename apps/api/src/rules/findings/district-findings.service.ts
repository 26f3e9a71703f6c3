import type { Quantity, Truth } from '@lidwatch/atmosphere';
import type { MeasuredValues } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Sql } from '../../database/sql';
import { DistrictPlans, staleAfterS, type PlanTower } from './district-plan';
import { measuresFromJson, quantityOf } from './measures-json';

/** No series the API answers has more points than this. */
export const MOST_POINTS = 2_000;
const HOUR_S = 3600;

/** What is known of a district's air: its newest block, and whether that is recent enough to speak for now. */
export interface DistrictFinding {
  readonly districtId: number;
  readonly timeZone: string;
  /** End of the newest block; null before the first. */
  readonly tEnd: number | null;
  readonly fresh: boolean;
  /** Why nothing is known of now, where it is not. */
  readonly reason?: string;
  readonly speaker: PlanTower | null;
  /** Names of the towers that gave nothing for this block. */
  readonly silent: readonly string[];
  readonly values: MeasuredValues;
}

/** One point of a district's history. */
export interface HistoryPoint {
  readonly tEnd: number;
  readonly strengthC: Quantity;
  readonly withinC: number | null;
  readonly sure: Truth;
  readonly speakerId: number | null;
  readonly reason: string | null;
}

interface HistoryRow {
  tEnd: number;
  blockS: number;
  lo: number | null;
  hi: number | null;
  withinC: number | null;
  sure: number | null;
  speakerId: number | null;
  reason: string | null;
}

const LATEST = `SELECT t_end tEnd, speaker_id speakerId, silent, measures, reason FROM district_block
  WHERE district_id = $1 AND t_end <= $2 ORDER BY t_end DESC LIMIT 1`;
const HISTORY = `SELECT t_end tEnd, block_s blockS, strength_lo lo, strength_hi hi, within_c withinC, sure,
  speaker_id speakerId, reason FROM district_block WHERE district_id = $1 AND t_end > $2 AND t_end <= $3 ORDER BY t_end`;

const truthOf = (sure: number | null): Truth => (sure === null ? 'not known' : sure === 1 ? 'true' : 'false');

/** What the districts' towers say together, now and in the past. */
@Injectable()
export class DistrictFindingsService {
  constructor(
    private readonly sql: Sql,
    private readonly plans: DistrictPlans,
    private readonly clock: Clock,
  ) {}

  /** The newest finding of a district; undefined without the district. */
  async latest(districtId: number): Promise<DistrictFinding | undefined> {
    const plan = (await this.plans.all()).get(districtId);
    if (!plan) return undefined;
    const now = this.clock.now();
    const row = await this.sql.get<{
      tEnd: number;
      speakerId: number | null;
      silent: string;
      measures: string;
      reason: string | null;
    }>(LATEST, [districtId, now]);
    const common = { districtId, timeZone: plan.timeZone };
    if (!row) {
      const reason = 'no tower has given a block yet';
      return { ...common, tEnd: null, fresh: false, reason, speaker: null, silent: [], values: {} };
    }
    const name = (id: number) => plan.towers.find((tower) => tower.id === id)?.name ?? `tower ${id}`;
    const silent = (JSON.parse(row.silent) as number[]).map(name);
    const fresh = now - row.tEnd < staleAfterS(plan);
    const reason = fresh
      ? row.reason
      : `no tower has answered for ${Math.round((now - row.tEnd) / 60)} minutes`;
    return {
      ...{ ...common, tEnd: row.tEnd, fresh, silent, values: measuresFromJson(row.measures) },
      speaker: plan.towers.find(({ id }) => id === row.speakerId) ?? null,
      ...(reason !== null && { reason }),
    };
  }

  /** A district's inversion strength over (from, to]: every block, or hourly where those would be too many. */
  async history(
    districtId: number,
    from: number,
    to: number,
  ): Promise<{ stepS: number; points: HistoryPoint[] }> {
    const rows = await this.sql.all<HistoryRow>(HISTORY, [districtId, from, to]);
    const blockS = rows.at(-1)?.blockS ?? HOUR_S;
    let stepS = blockS;
    while ((to - from) / stepS > MOST_POINTS) stepS = stepS < HOUR_S ? HOUR_S : stepS * 2;
    const kept = stepS === blockS ? rows : rows.filter(({ tEnd }) => tEnd % stepS === 0);
    return { stepS, points: kept.slice(0, MOST_POINTS).map(pointOf) };
  }
}

const pointOf = ({ tEnd, lo, hi, withinC, sure, speakerId, reason }: HistoryRow): HistoryPoint => ({
  ...{ tEnd, withinC, speakerId, reason, sure: truthOf(sure) },
  strengthC: quantityOf(lo, hi, reason ?? undefined),
});

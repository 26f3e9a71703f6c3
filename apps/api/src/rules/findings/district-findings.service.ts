import type { MeasuredValues } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Sql } from '../../database/sql';
import { DistrictPlans, staleAfterS, type PlanTower } from './district-plan';
import { measuresFromJson } from './measures-json';

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

const LATEST = `SELECT t_end tEnd, speaker_id speakerId, silent, measures, reason FROM district_block
  WHERE district_id = $1 AND t_end <= $2 ORDER BY t_end DESC LIMIT 1`;
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
}

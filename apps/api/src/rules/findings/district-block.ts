import { exactly, isNotKnown, notKnown, type HourlyMean } from '@lidwatch/atmosphere';
import type { MeasuredValues } from '@lidwatch/rules';
import type { ForecastBook } from '../../forecasts/known-forecasts';
import { answerOf, blockAt, type Answer } from './answering';
import type { DistrictPlan, PlanTower } from './district-plan';
import { episodeMinutes, EPISODE_REACH_S, type StrengthAt } from './episode-minutes';
import { floorToBenchC } from './floor-and-bench';
import { forecastValues } from './forecast-values';
import { localMoment } from './local-time';
import { SMOKE_REACH_S, smokeValues } from './smoke';
import type { TowerBlocks } from './tower-blocks';

/** One block of a district: what was measured, for beginning and, where other towers may end, for ending. */
export interface DistrictBlock {
  readonly districtId: number;
  readonly tEnd: number;
  readonly blockS: number;
  readonly speakerId: number | null;
  readonly spoke: string | null;
  /** Towers that gave nothing for this block. */
  readonly silent: readonly number[];
  readonly values: MeasuredValues;
  /** Null where the same towers may begin and end. */
  readonly end: { readonly spoke: string | null; readonly values: MeasuredValues } | null;
  /** Why nothing is known of a surface inversion; null where something is. */
  readonly reason: string | null;
}

/** What a district's block is worked out from. */
export interface DistrictSources {
  readonly plan: DistrictPlan;
  readonly blocks: TowerBlocks;
  /** Hourly means of the district's monitor; undefined where it has none. */
  readonly hours: readonly HourlyMean[] | undefined;
  /** What the forecasts said, as they were known. */
  readonly forecasts: ForecastBook;
  /** The district's earlier blocks, as kept or as just worked out. */
  readonly earlier: (t: number) => StrengthAt;
}

/** How far back a block's values look, s; a change of a tower's block reaches as far ahead. */
export const REACH_S = Math.max(SMOKE_REACH_S, EPISODE_REACH_S + 3600);

const GAVE_NOTHING = notKnown('the tower gave nothing for this block');

const levelsOf = (speaker: PlanTower | null, blocks: TowerBlocks, t: number, blockS: number) =>
  (speaker && blockAt(speaker, blocks, t, blockS)?.levels) ?? [];

/** The district's block that ends at t. */
export function districtBlock(sources: DistrictSources, t: number): DistrictBlock {
  const { plan, blocks, hours, earlier } = sources;
  const ask = (may: (tower: PlanTower) => boolean): Answer =>
    answerOf(plan, plan.towers.filter(may), blocks, t);
  const begin = ask(({ mayBegin }) => mayBegin);
  const same = plan.towers.every(({ mayBegin, mayEnd }) => mayBegin === mayEnd);
  const end = same ? null : ask(({ mayEnd }) => mayEnd);
  const strengthC = begin.values.inversionStrengthC ?? GAVE_NOTHING;
  const { hour, month } = localMoment(plan.timeZone, t);
  const ofTheDistrict: MeasuredValues = {
    episodeMinutes: episodeMinutes({ spoke: begin.spoke, strengthC }, earlier, t, plan.blockS),
    floorToBenchC: floorToBenchC(plan, blocks, t),
    ...smokeValues(hours, t, plan.timeZone),
    ...forecastValues(sources.forecasts, plan, t, levelsOf(begin.speaker, blocks, t, plan.blockS)),
    hourOfDay: exactly(hour),
    month: exactly(month),
  };
  const noTower = begin.spoke === null ? 'no tower has answered lately' : null;
  return {
    ...{ districtId: plan.districtId, tEnd: t, blockS: plan.blockS },
    ...{ speakerId: begin.speaker?.id ?? null, spoke: begin.spoke },
    silent: plan.towers.filter((tower) => !blockAt(tower, blocks, t, plan.blockS)).map(({ id }) => id),
    values: { ...begin.values, ...ofTheDistrict },
    end: end && { spoke: end.spoke, values: { ...end.values, ...ofTheDistrict } },
    reason: noTower ?? (isNotKnown(strengthC) ? (strengthC.reason ?? null) : null),
  };
}

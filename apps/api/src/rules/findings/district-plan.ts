import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import { DistrictsService } from '../../districts/districts.service';
import type { DistrictDto } from '../../districts/dto/district.dto';
import type { TowerDto } from '../../towers/dto/tower.dto';
import { TowersService } from '../../towers/towers.service';

const MINUTE_S = 60;
/** A tower whose newest valid block ended longer ago than this, or than 2.5 of its intervals, no longer speaks, s. */
const LEAST_STALE_LIMIT_S = 45 * MINUTE_S;
/** Length of a district's blocks while no tower answers for it, s. */
const USUAL_BLOCK_S = 15 * MINUTE_S;
const STALE_INTERVALS = 2.5;

/** A tower as a district's findings need it. */
export interface PlanTower {
  readonly id: number;
  readonly name: string;
  readonly elevationM: number;
  readonly intervalS: number;
  readonly blockS: number;
  readonly staleLimitS: number;
  readonly mayBegin: boolean;
  readonly mayEnd: boolean;
}

/** Which towers answer for a district, and how. */
export interface DistrictPlan {
  readonly districtId: number;
  readonly timeZone: string;
  readonly combine: DistrictDto['combine'];
  /** In the order in which they are asked. */
  readonly towers: readonly PlanTower[];
  readonly floor: PlanTower | undefined;
  readonly bench: PlanTower | undefined;
  readonly pm25: PlanTower | undefined;
  /** Length of the district's blocks: that of its first tower (of its PM2.5 monitor where it has none), s. */
  readonly blockS: number;
}

/** Every tower a plan asks anything of. */
export const towerIdsOf = (plan: DistrictPlan): number[] => [
  ...new Set(
    [...plan.towers, plan.floor, plan.bench, plan.pm25].flatMap((tower) => (tower ? [tower.id] : [])),
  ),
];

/** A district's newest block speaks for now until it ended this long ago, s. */
export const staleAfterS = (plan: DistrictPlan): number =>
  Math.max(plan.blockS, LEAST_STALE_LIMIT_S, ...plan.towers.map(({ staleLimitS }) => staleLimitS));

function planTower(tower: TowerDto, roles: { mayBegin: boolean; mayEnd: boolean }): PlanTower {
  const { id, name, elevationM } = tower;
  const intervalS = tower.intervalMinutes * MINUTE_S;
  const usual = Math.max(LEAST_STALE_LIMIT_S, STALE_INTERVALS * intervalS);
  const staleLimitS = tower.staleLimitMinutes === null ? usual : tower.staleLimitMinutes * MINUTE_S;
  return { id, name, elevationM, intervalS, blockS: tower.blockMinutes * MINUTE_S, staleLimitS, ...roles };
}

const VERSIONS = `SELECT (SELECT group_concat(id || ':' || version) FROM district) || '|' ||
  (SELECT group_concat(id || ':' || version) FROM tower) versions`;

/** Says for each district which towers answer for it; read anew when a district or a tower has changed. */
@Injectable()
export class DistrictPlans {
  private kept: { versions: string | null; plans: ReadonlyMap<number, DistrictPlan> } | undefined;

  constructor(
    private readonly districts: DistrictsService,
    private readonly towers: TowersService,
    private readonly sql: Sql,
  ) {}

  /** The plan of every district, by its id. */
  async all(): Promise<ReadonlyMap<number, DistrictPlan>> {
    const versions = (await this.sql.get<{ versions: string | null }>(VERSIONS))?.versions ?? null;
    if (this.kept?.versions !== versions) this.kept = { versions, plans: await this.read() };
    return this.kept!.plans;
  }

  private async read(): Promise<Map<number, DistrictPlan>> {
    const towers = new Map((await this.towers.list()).map((tower) => [tower.id, tower]));
    const plans = (await this.districts.list()).map((district) => planOf(district, towers));
    return new Map(plans.map((plan) => [plan.districtId, plan]));
  }
}

function planOf(district: DistrictDto, all: ReadonlyMap<number, TowerDto>): DistrictPlan {
  const other = (id: number | null): PlanTower | undefined => {
    const tower = id === null ? undefined : all.get(id);
    return tower && planTower(tower, { mayBegin: false, mayEnd: false });
  };
  const towers = district.towers.flatMap(({ towerId, mayBegin, mayEnd }) => {
    const tower = all.get(towerId);
    return tower && !tower.retired ? [planTower(tower, { mayBegin, mayEnd })] : [];
  });
  const pm25 = other(district.pm25TowerId);
  return {
    ...{ districtId: district.id, timeZone: district.timeZone, combine: district.combine, towers, pm25 },
    floor: other(district.floorTowerId),
    bench: other(district.benchTowerId),
    blockS: (towers[0] ?? pm25)?.blockS ?? USUAL_BLOCK_S,
  };
}

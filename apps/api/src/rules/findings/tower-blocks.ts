import type { HourlyMean } from '@lidwatch/atmosphere';
import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import type { OtherQuantities, StoredLevel } from '../../profiles/block-facts';

/** One tower's block as the district's findings read it. */
export interface TowerBlock {
  readonly towerId: number;
  readonly tEnd: number;
  readonly levels: readonly StoredLevel[];
  readonly surface: 'present' | 'absent' | 'not known';
  readonly reason: string | null;
  readonly depth: readonly [number | null, number | null];
  readonly strength: readonly [number | null, number | null];
  readonly withinC: number | null;
  readonly gradient: number | null;
  readonly sure: 0 | 1 | null;
  readonly stable: readonly [number | null, number | null];
  readonly lidBaseM: number | null;
  readonly lidStrength: readonly [number | null, number | null];
  readonly heat: readonly [number | null, number | null];
  readonly pressureHPa: number | null;
  readonly other: OtherQuantities;
}

type Row = Record<string, number | string | null>;

const ROWS = `SELECT tower_id, t_end, levels, surface, reason, depth_lo, depth_hi, strength_lo, strength_hi, within_c,
  gradient, sure, stable_lo, stable_hi, elevated_base_m, elevated_strength_lo, elevated_strength_hi, heat_lo, heat_hi,
  pressure_hpa, pressure_assumed, other
  FROM profile WHERE tower_id IN (SELECT value FROM json_each($1)) AND t_end > $2 AND t_end <= $3 ORDER BY t_end`;

const HOURS = `SELECT tower_id towerId, t_end tEnd, other->>'pm25Hour' valueUgM3 FROM profile
  WHERE tower_id IN (SELECT value FROM json_each($1)) AND t_end > $2 AND t_end <= $3 AND t_end % 3600 = 0 ORDER BY t_end`;

/** Hourly means of PM2.5 by monitor, in order of time. */
export type MonitorHours = ReadonlyMap<number, readonly HourlyMean[]>;

function blockOf(row: Row): TowerBlock {
  const number = (column: string): number | null => row[column] as number | null;
  const bounds = (name: string) => [number(`${name}_lo`), number(`${name}_hi`)] as const;
  return {
    towerId: row['tower_id'] as number,
    tEnd: row['t_end'] as number,
    levels: JSON.parse(row['levels'] as string) as StoredLevel[],
    surface: row['surface'] as TowerBlock['surface'],
    reason: row['reason'] as string | null,
    depth: bounds('depth'),
    strength: bounds('strength'),
    withinC: number('within_c'),
    gradient: number('gradient'),
    sure: row['sure'] as 0 | 1 | null,
    stable: bounds('stable'),
    lidBaseM: number('elevated_base_m'),
    lidStrength: bounds('elevated_strength'),
    heat: bounds('heat'),
    pressureHPa: row['pressure_assumed'] === 1 ? null : number('pressure_hpa'),
    other: JSON.parse(row['other'] as string) as OtherQuantities,
  };
}

/** Some towers' blocks over a stretch of time, found by tower and end. */
export class TowerBlocks {
  private readonly byTower = new Map<number, TowerBlock[]>();

  /** Takes blocks in order of time. */
  constructor(blocks: readonly TowerBlock[]) {
    for (const block of blocks) {
      const kept = this.byTower.get(block.towerId);
      if (kept) kept.push(block);
      else this.byTower.set(block.towerId, [block]);
    }
  }

  /** The newest block of a tower that ends in (after, until], of those that `fits` lets pass. */
  newest(
    towerId: number,
    after: number,
    until: number,
    fits: (block: TowerBlock) => boolean = () => true,
  ): TowerBlock | undefined {
    const blocks = this.byTower.get(towerId) ?? [];
    for (let i = this.countUntil(blocks, until) - 1; i >= 0; i -= 1) {
      const block = blocks[i]!;
      if (block.tEnd <= after) return undefined;
      if (fits(block)) return block;
    }
    return undefined;
  }

  private countUntil(blocks: readonly TowerBlock[], until: number): number {
    let lo = 0;
    let hi = blocks.length;
    while (lo < hi) {
      const middle = (lo + hi) >> 1;
      if (blocks[middle]!.tEnd <= until) lo = middle + 1;
      else hi = middle;
    }
    return lo;
  }
}

/** Reads towers' blocks. */
@Injectable()
export class TowerBlockRows {
  constructor(private readonly sql: Sql) {}

  /** The blocks of some towers that end in (after, until]. */
  async between(towerIds: readonly number[], after: number, until: number): Promise<TowerBlocks> {
    const rows = await this.sql.all<Row>(ROWS, [JSON.stringify(towerIds), after, until]);
    return new TowerBlocks(rows.map(blockOf));
  }

  /** The full clock hours of PM2.5 of some monitors that end in (after, until]. */
  async hours(towerIds: readonly number[], after: number, until: number): Promise<MonitorHours> {
    const rows = await this.sql.all<{ towerId: number; tEnd: number; valueUgM3: number | null }>(HOURS, [
      JSON.stringify(towerIds),
      after,
      until,
    ]);
    const hours = new Map<number, HourlyMean[]>();
    for (const { towerId, ...hour } of rows) hours.set(towerId, [...(hours.get(towerId) ?? []), hour]);
    return hours;
  }
}

import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { TowerLayouts } from '../towers/tower-layouts';
import type { BlockFacts, OtherQuantities, StoredLevel } from './block-facts';
import type { ProfileDto, ProfileSpan } from './dto/profile.dto';
import { showProfile } from './show-profile';

interface KeptProfile {
  readonly tEnd: number;
  readonly rev: number;
  readonly levels: string;
  readonly pressureHpa: number | null;
  readonly pressureAssumed: number;
  readonly other: string;
}

const SELECT = `SELECT t_end tEnd, rev, levels, pressure_hpa pressureHpa, pressure_assumed pressureAssumed, other
  FROM profile WHERE tower_id = $1`;
const EVER_S = 253_402_300_799;

/** Profiles as they are kept, with what follows from them. */
@Injectable()
export class ProfilesService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
  ) {}

  /** The newest profile of a tower; 404 where it has none yet. */
  async latest(towerId: number): Promise<ProfileDto> {
    const row = await this.sql.get<KeptProfile>(`${SELECT} ORDER BY t_end DESC LIMIT 1`, [towerId]);
    if (!row) throw new Problem('not-found', `Tower ${towerId} has no profile yet.`);
    return this.show(towerId, row);
  }

  /** The profile of the block that ends at an instant; undefined where the block gave none. */
  async at(towerId: number, tEnd: number): Promise<ProfileDto | undefined> {
    const row = await this.sql.get<KeptProfile>(`${SELECT} AND t_end = $2`, [towerId, tEnd]);
    return row && this.show(towerId, row);
  }

  /** Profiles whose block ends in [from, to], in order of time, at most `limit`; `next` says where to go on. */
  async range(towerId: number, from = 0, to = EVER_S, limit = 500): Promise<ProfileSpan> {
    const rows = await this.sql.all<KeptProfile>(
      `${SELECT} AND t_end >= $2 AND t_end <= $3 ORDER BY t_end LIMIT $4`,
      [towerId, from, to, limit + 1],
    );
    const items: ProfileDto[] = [];
    for (const row of rows.slice(0, limit)) items.push(await this.show(towerId, row));
    const next = rows[limit];
    return next ? { items, next: toIso(next.tEnd) } : { items };
  }

  private async show(towerId: number, row: KeptProfile): Promise<ProfileDto> {
    const facts: BlockFacts = {
      towerId,
      tEnd: row.tEnd,
      levels: JSON.parse(row.levels) as StoredLevel[],
      pressureHpa: row.pressureAssumed ? null : row.pressureHpa,
      other: JSON.parse(row.other) as OtherQuantities,
    };
    return showProfile(facts, row.rev, await this.layouts.of(towerId));
  }
}

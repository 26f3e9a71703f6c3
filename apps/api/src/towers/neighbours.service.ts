import { Injectable } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { invalid } from '../common/validation';
import { DirtyStages } from '../database/dirty';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { ReworkService } from '../rework/rework.service';
import type { NeighboursDto } from './dto/neighbours.dto';
import { TowerLayouts } from './tower-layouts';
import { TowersService } from './towers.service';

/** Which towers' readings speak for and against another's. A site declares them; distance alone makes no neighbour. */
@Injectable()
export class NeighboursService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
    private readonly towers: TowersService,
    private readonly dirty: DirtyStages,
    private readonly reworks: ReworkService,
    private readonly work: UnitOfWork,
    private readonly activity: ActivityService,
  ) {}

  /** The neighbours of a tower. */
  async of(towerId: number): Promise<NeighboursDto> {
    const { neighbourIds } = await this.layouts.of(towerId);
    return { towerIds: [...neighbourIds] };
  }

  /** Sets a tower's neighbours; its record is screened anew. */
  set(towerId: number, { towerIds }: NeighboursDto, by: SignedIn): Promise<NeighboursDto> {
    return this.work.run(async () => {
      const { neighbourIds: before } = await this.layouts.of(towerId);
      if (towerIds.includes(towerId))
        throw invalid([
          { field: 'towerIds', text: 'A tower is no neighbour of itself: choose other towers.' },
        ]);
      await this.towers.refuseUnknown(towerIds, 'towerIds');
      const after = [...towerIds].sort((a, b) => a - b);
      if (JSON.stringify(after) === JSON.stringify(before)) return { towerIds: after };
      await this.sql.run('DELETE FROM tower_neighbour WHERE tower_id = $1', [towerId]);
      await this.sql.run('INSERT INTO tower_neighbour SELECT $1, value FROM json_each($2)', [
        towerId,
        JSON.stringify(after),
      ]);
      this.layouts.forget(towerId);
      await this.dirty.markTower(towerId);
      await this.reworks.begin({ towerId, cause: 'Neighbouring towers changed', byUser: by.id });
      const changes = { neighbours: [await this.names(before), await this.names(after)] };
      const subject = `tower ${towerId}`;
      await this.activity.record({ actor: by, act: 'neighbours changed', subject, body: { changes } });
      return { towerIds: after };
    });
  }

  private async names(ids: readonly number[]): Promise<string> {
    const layouts = await Promise.all(ids.map((id) => this.layouts.of(id)));
    return layouts.map(({ name }) => name).join(' and ');
  }
}

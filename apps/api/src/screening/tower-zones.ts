import { Injectable } from '@nestjs/common';
import { DistrictsService } from '../districts/districts.service';

/** In which zone a tower's days are counted. */
@Injectable()
export class TowerZones {
  constructor(private readonly districts: DistrictsService) {}

  /** The zone of the first district, by name, in which the tower has a part; UTC where it has none. */
  async of(towerId: number): Promise<string> {
    const own = (await this.districts.list()).find(
      ({ towers, floorTowerId, benchTowerId, pm25TowerId }) =>
        towers.some((each) => each.towerId === towerId) ||
        [floorTowerId, benchTowerId, pm25TowerId].includes(towerId),
    );
    return own?.timeZone ?? 'UTC';
  }
}

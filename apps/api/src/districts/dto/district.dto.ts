import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import type { District } from '../models/district.model';

/** How several towers speak as one. */
export const combinations = ['first-fresh', 'any', 'all', 'median'] as const;

/** A tower that speaks for a district. Their order is the order in which they are asked. */
@ApiSchema({ name: 'DistrictTower' })
export class DistrictTowerDto {
  @ApiProperty() towerId!: number;
  @ApiProperty({ description: 'Whether what this tower shows may begin a finding' }) mayBegin!: boolean;
  @ApiProperty({ description: 'Whether what this tower shows may end a finding' }) mayEnd!: boolean;
}

/** A district as the API shows it. */
@ApiSchema({ name: 'District' })
export class DistrictDto {
  @ApiProperty() id!: number;
  @ApiProperty() slug!: string;
  @ApiProperty() name!: string;
  @ApiProperty({ example: 'America/Denver' }) timeZone!: string;
  @ApiProperty() latitude!: number;
  @ApiProperty() longitude!: number;
  @ApiProperty({ type: Number, nullable: true }) elevationM!: number | null;
  @ApiProperty({ type: Number, nullable: true }) population!: number | null;
  @ApiProperty() areaText!: string;
  @ApiProperty() ordinanceRef!: string;
  @ApiProperty() contactPhone!: string;
  @ApiProperty({ enum: combinations }) combine!: (typeof combinations)[number];
  @ApiProperty({ type: [DistrictTowerDto] }) towers!: DistrictTowerDto[];
  @ApiProperty({ type: Number, nullable: true }) floorTowerId!: number | null;
  @ApiProperty({ type: Number, nullable: true }) benchTowerId!: number | null;
  @ApiProperty({ type: Number, nullable: true }) pm25TowerId!: number | null;
  @ApiProperty() version!: number;
}

/** A stored district in the API's shape. */
export function showDistrict(district: District): DistrictDto {
  const { id, slug, name, timeZone, latitude, longitude, elevationM, population, areaText } = district;
  const { ordinanceRef, contactPhone, combine, floorTowerId, benchTowerId, pm25TowerId, version } = district;
  const towers = [...district.towers]
    .sort((a, b) => a.position - b.position)
    .map((each) => ({
      towerId: each.towerId,
      mayBegin: Boolean(each.mayBegin),
      mayEnd: Boolean(each.mayEnd),
    }));
  return {
    ...{ id, slug, name, timeZone, latitude, longitude, elevationM, population, areaText, ordinanceRef },
    ...{ contactPhone, combine, towers, floorTowerId, benchTowerId, pm25TowerId, version },
  };
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { ArrayMaxSize, ArrayUnique, IsArray, IsInt } from 'class-validator';

/** Towers whose readings are looked at when a tower's are screened. */
@ApiSchema({ name: 'Neighbours' })
export class NeighboursDto {
  @ApiProperty({ type: [Number], description: 'Ids of other towers, at most 8' })
  @IsArray({ message: 'towerIds must be a list of towers' })
  @ArrayMaxSize(8, { message: 'towerIds must name at most 8 towers' })
  @ArrayUnique({ message: 'towerIds must name each tower once' })
  @IsInt({ each: true, message: 'towerIds must be the ids of towers' })
  towerIds!: number[];
}

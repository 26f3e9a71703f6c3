import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { IsISO8601 } from 'class-validator';
import { pageOf } from '../../common/paging';

/** Something that was changed about a tower. */
@ApiSchema({ name: 'TowerChange' })
export class TowerChangeDto {
  @ApiProperty() id!: number;
  @ApiProperty() at!: string;
  @ApiProperty({ description: 'Who, or "service"' }) by!: string;
  @ApiProperty({ description: 'What was done, as a short phrase' }) act!: string;
  @ApiProperty({ description: 'What exactly, from what to what where that is kept; may be empty' })
  what!: string;
}

/** A page of a tower's changes, the newest first. */
export class TowerChangePage extends pageOf(TowerChangeDto) {}

/** From when a version of a sensor really holds. */
export class VersionDateInput {
  @ApiProperty()
  @IsISO8601({ strict: true }, { message: 'from must be an instant such as 2026-01-31T05:10:00Z' })
  from!: string;
}

import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsOptional } from 'class-validator';
import { PageQuery, pageOf } from '../../common/paging';

/** One entry of the record. */
export class ActivityEntry {
  @ApiProperty()
  seq!: number;
  @ApiProperty({ format: 'date-time' })
  at!: string;
  @ApiProperty({ description: "A person's name, or `service`." })
  actor!: string;
  @ApiProperty()
  act!: string;
  @ApiProperty()
  subject!: string;
  @ApiProperty({ type: Number, nullable: true })
  districtId!: number | null;
  @ApiProperty({ description: 'Links the entry to the one before it.' })
  hash!: string;
}

/** One page of the record, the newest first. */
export class ActivityPage extends pageOf(ActivityEntry) {}

/** Which part of the record is wanted. */
export class ActivityQuery extends PageQuery {
  @ApiPropertyOptional()
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  districtId?: number;
}

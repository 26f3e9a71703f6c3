import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsOptional } from 'class-validator';

const celsius = {
  type: Number,
  nullable: true,
  description: 'Within the tower, °C; null where none was present',
};

/** Whose reworks are wanted. */
export class ReworksQuery {
  @ApiPropertyOptional()
  @IsOptional()
  @Type(() => Number)
  @IsInt({ message: 'towerId must be the id of a tower' })
  towerId?: number;
}

/** What a district's rule said otherwise afterwards. */
@ApiSchema({ name: 'DistrictTruthsChanged' })
export class DistrictTruthsChangedDto {
  @ApiProperty() districtId!: number;
  @ApiProperty() name!: string;
  @ApiProperty({ description: 'Blocks of the last 24 h for which the rule in force now says otherwise' })
  truthsChanged!: number;
}

/** What was different in a tower's findings afterwards; numbers are about the blocks that changed. */
@ApiSchema({ name: 'ChangedFindings' })
export class ChangedFindingsDto {
  @ApiProperty({ description: 'Blocks whose profile or findings differ' }) blocksChanged!: number;
  @ApiProperty() presentToAbsent!: number;
  @ApiProperty() absentToPresent!: number;
  @ApiProperty() toNotKnown!: number;
  @ApiProperty() fromNotKnown!: number;
  @ApiProperty({ description: 'Inversions that were sure and are not any more' }) toNotSure!: number;
  @ApiProperty({ description: 'Inversions that were not sure and now are' }) toSure!: number;
  @ApiProperty(celsius) strongestBeforeC!: number | null;
  @ApiProperty(celsius) strongestAfterC!: number | null;
  @ApiProperty() inversionHoursBefore!: number;
  @ApiProperty() inversionHoursAfter!: number;
  @ApiProperty({ type: [DistrictTruthsChangedDto] }) districts!: DistrictTruthsChangedDto[];
}

/** Something that was changed, and the working out anew that followed. */
@ApiSchema({ name: 'Rework' })
export class ReworkDto {
  @ApiProperty() id!: number;
  @ApiProperty() towerId!: number;
  @ApiProperty({ description: 'What was changed, in words' }) cause!: string;
  @ApiProperty({ type: String, nullable: true, description: 'null: the service itself' }) by!: string | null;
  @ApiProperty({ description: 'Begin of the first block concerned' }) from!: string;
  @ApiProperty({ description: 'End of the last block concerned' }) to!: string;
  @ApiProperty() begunAt!: string;
  @ApiProperty({ type: String, nullable: true }) endedAt!: string | null;
  @ApiProperty({ description: 'Blocks to be worked out anew' }) blocks!: number;
  @ApiProperty({ description: "The tower's blocks that still wait" }) pending!: number;
  @ApiProperty({ description: "The districts' blocks that still wait" }) pendingDistricts!: number;
  @ApiProperty({ type: ChangedFindingsDto, nullable: true, description: 'null until it has ended' })
  changes!: ChangedFindingsDto | null;
}

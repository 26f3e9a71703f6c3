import { checkBits, type Check, type Quality, qualityCodes } from '@lidwatch/contracts';
import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { pageOf } from '../../common/paging';

/** Consecutive readings of one sensor that one check spoke of. */
@ApiSchema({ name: 'FlaggedSpan' })
export class FlaggedSpanDto {
  @ApiProperty() sensorId!: number;
  @ApiProperty() sensorName!: string;
  @ApiProperty({ enum: Object.keys(checkBits) }) check!: Check;
  @ApiProperty({ description: 'What the check found, in plain words with its limits' }) says!: string;
  @ApiProperty({ enum: Object.keys(qualityCodes), description: 'The worst of its readings' })
  quality!: Quality;
  @ApiProperty({ description: 'End of the first reading' }) from!: string;
  @ApiProperty({ description: 'End of the last reading' }) to!: string;
  @ApiProperty() readings!: number;
  @ApiProperty({ type: String, nullable: true, description: 'Whose word holds instead of the check' })
  setBy!: string | null;
}

/** Flagged spans, the newest first. */
export class FlaggedSpanPage extends pageOf(FlaggedSpanDto) {}

import { checkBits, type Check, type Quality, qualityCodes } from '@lidwatch/contracts';
import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { SeenSensorDto } from './calendar.dto';

/** A reading as it came. */
@ApiSchema({ name: 'RawReading' })
export class RawReadingDto {
  @ApiProperty({ description: 'End of its interval' }) t!: string;
  @ApiProperty({ description: 'As it came' }) value!: number;
  @ApiPropertyOptional({ description: 'With the correction of its time; left out where there is none' })
  corrected?: number;
  @ApiProperty({ enum: Object.keys(qualityCodes) }) quality!: Quality;
  @ApiPropertyOptional({ enum: Object.keys(checkBits), isArray: true, description: 'What spoke of it' })
  checks?: Check[];
}

/** One sensor's readings of a stretch. */
@ApiSchema({ name: 'RawSeries' })
export class RawSeriesDto extends SeenSensorDto {
  @ApiProperty({ description: 'How many there are' }) readings!: number;
  @ApiProperty() suspect!: number;
  @ApiProperty() failed!: number;
  @ApiProperty({ description: 'Fewer are given: the extremes of each part of the time, and what is flagged' })
  thinned!: boolean;
  @ApiProperty({ type: [RawReadingDto] }) points!: RawReadingDto[];
}

/** A tower's readings as they came, at most 2,000 a sensor. */
@ApiSchema({ name: 'RawReadings' })
export class RawReadingsDto {
  @ApiProperty() towerId!: number;
  @ApiProperty() timeZone!: string;
  @ApiProperty() from!: string;
  @ApiProperty() to!: string;
  @ApiProperty({ type: [RawSeriesDto] }) sensors!: RawSeriesDto[];
}

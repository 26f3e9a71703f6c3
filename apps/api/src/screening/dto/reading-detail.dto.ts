import { checkBits, type Check, type Quality, qualityCodes } from '@lidwatch/contracts';
import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsISO8601 } from 'class-validator';

/** Which reading is wanted. */
export class ReadingQuery {
  @ApiProperty()
  @Type(() => Number)
  @IsInt({ message: 'sensorId must be the id of a sensor of this tower' })
  sensorId!: number;

  @ApiProperty({ description: 'End of its interval' })
  @IsISO8601(
    { strict: true },
    { message: 't must be an instant with its offset, such as 2026-01-31T05:10:00Z' },
  )
  t!: string;
}

/** A check that spoke of a reading. */
@ApiSchema({ name: 'SaidOfReading' })
export class SaidOfReadingDto {
  @ApiProperty({ enum: Object.keys(checkBits) }) check!: Check;
  @ApiProperty({ description: 'In plain words with its limits' }) says!: string;
}

/** The word of a person that holds for a reading. */
@ApiSchema({ name: 'WordOnReading' })
export class WordOnReadingDto {
  @ApiProperty({ enum: ['valid', 'failed'] }) quality!: 'valid' | 'failed';
  @ApiProperty() by!: string;
  @ApiProperty() at!: string;
  @ApiProperty() reason!: string;
}

/** Where a value came from. */
@ApiSchema({ name: 'ReadingOrigin' })
export class ReadingOriginDto {
  @ApiProperty() importId!: number;
  @ApiProperty({ description: 'Of the file, or of the key that pushed it' }) name!: string;
  @ApiProperty() origin!: string;
  @ApiProperty() receivedAt!: string;
  @ApiProperty({ description: 'The row of the file' }) rowNo!: number;
}

/** A value that was in force before. */
@ApiSchema({ name: 'EarlierValue' })
export class EarlierValueDto {
  @ApiProperty() value!: number;
  @ApiProperty({ description: 'Until when it was in force' }) until!: string;
  @ApiProperty({ type: ReadingOriginDto }) from!: ReadingOriginDto;
}

/** One reading with all that is known of it: the file and row it came from, what was said of it, what it was before. */
@ApiSchema({ name: 'ReadingDetail' })
export class ReadingDetailDto {
  @ApiProperty() sensorId!: number;
  @ApiProperty() sensorName!: string;
  @ApiProperty() unit!: string;
  @ApiProperty() t!: string;
  @ApiProperty({ description: 'As it came' }) value!: number;
  @ApiProperty({ description: 'With the correction of its time' }) corrected!: number;
  @ApiProperty({ enum: Object.keys(qualityCodes) }) quality!: Quality;
  @ApiProperty({ type: [SaidOfReadingDto] }) checks!: SaidOfReadingDto[];
  @ApiProperty({ type: WordOnReadingDto, nullable: true }) word!: WordOnReadingDto | null;
  @ApiProperty({ type: ReadingOriginDto }) from!: ReadingOriginDto;
  @ApiProperty({ type: [EarlierValueDto], description: 'The newest first' }) earlier!: EarlierValueDto[];
}

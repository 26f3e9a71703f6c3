import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  IsArray,
  IsBoolean,
  IsIn,
  IsInt,
  IsObject,
  IsOptional,
  IsString,
  Length,
  Matches,
  Max,
  Min,
  ValidateNested,
} from 'class-validator';
import {
  missingHours,
  repeatedHours,
  type MissingHour,
  type RepeatedHour,
} from '../time-keeping/logger-clock';
import { stampForms, type StampForm } from '../time-keeping/stamp';
import { timeParts, type TimePart } from '../time-keeping/time-parts';
import { foreignUnitNames, type ForeignUnit } from '../units';
import { IsLoggerClock } from './is-logger-clock';
import { stamps } from './tower.dto';

const formats = ['wide', 'long'] as const;

/** A column that holds a part of the time. */
@ApiSchema({ name: 'TimeColumn' })
export class TimeColumnInput {
  @ApiProperty() @IsString() @Length(1, 200) column!: string;

  @ApiProperty({ enum: timeParts })
  @IsIn(timeParts, { message: `part must be one of ${timeParts.join(', ')}` })
  part!: TimePart;
}

/** Rows that are passed over: those with one of these texts in a column. */
@ApiSchema({ name: 'RowsLeftOut' })
export class RowsLeftOutInput {
  @ApiProperty() @IsString() @Length(1, 200) column!: string;

  @ApiProperty({ type: [String] })
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(20)
  @IsString({ each: true })
  values!: string[];
}

/** How a source's data is laid out; what is left out takes the usual value. */
@ApiSchema({ name: 'Mapping' })
export class MappingInput {
  @ApiPropertyOptional({ enum: formats, default: 'wide' })
  @IsOptional()
  @IsIn(formats, { message: 'format must be wide or long' })
  format?: (typeof formats)[number];

  @ApiPropertyOptional({ default: ',', description: 'One character, or "blank" for runs of blanks' })
  @IsOptional()
  @Matches(/^(.|\t|blank)$/, { message: 'separator must be one character, or "blank"' })
  separator?: string;

  @ApiPropertyOptional({ enum: ['.', ','], default: '.' })
  @IsOptional()
  @IsIn(['.', ','], { message: 'decimal must be a point or a comma' })
  decimal?: '.' | ',';

  @ApiPropertyOptional({ description: '0: no header, columns are "1", "2", …; left out: the first line' })
  @IsOptional()
  @IsInt()
  @Min(0)
  @Max(1000)
  headerRow?: number;

  @ApiPropertyOptional({ description: 'Where lines stand between the header and the first reading' })
  @IsOptional()
  @IsInt()
  @Min(1)
  @Max(1000)
  firstDataRow?: number;

  @ApiPropertyOptional({ default: 'time' }) @IsOptional() @IsString() @Length(1, 200) timeColumn?: string;

  @ApiPropertyOptional({
    type: () => [TimeColumnInput],
    description: 'Where the time stands in several columns; wins over timeColumn',
  })
  @IsOptional()
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(6)
  @ValidateNested({ each: true })
  @Type(() => TimeColumnInput)
  timeColumns?: TimeColumnInput[];

  @ApiPropertyOptional({ enum: stampForms, default: 'iso' })
  @IsOptional()
  @IsIn(stampForms, { message: `timeForm must be one of ${stampForms.join(', ')}` })
  timeForm?: StampForm;

  @ApiPropertyOptional({
    type: [String],
    description: 'Marks for "no reading"; the empty cell always is one',
  })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(20)
  @IsString({ each: true })
  missing?: string[];

  @ApiPropertyOptional({ type: Object, description: 'Header → sensor name, where they differ' })
  @IsOptional()
  @IsObject()
  columns?: Record<string, string>;

  @ApiPropertyOptional({ description: 'Take only what columns names; else what is called as a sensor, too' })
  @IsOptional()
  @IsBoolean()
  onlyNamed?: boolean;

  @ApiPropertyOptional({
    type: () => [RowsLeftOutInput],
    description: "Rows passed over, such as a day's summary",
  })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(5)
  @ValidateNested({ each: true })
  @Type(() => RowsLeftOutInput)
  leaveOut?: RowsLeftOutInput[];

  @ApiPropertyOptional({
    type: Object,
    description: `Column (wide) or sensor as written (long) → its unit, where it is not the sensor's own: ${foreignUnitNames.join(', ')}`,
  })
  @IsOptional()
  @IsObject()
  units?: Record<string, ForeignUnit>;

  @ApiPropertyOptional({ default: 'sensor' }) @IsOptional() @IsString() @Length(1, 200) sensorColumn?: string;
  @ApiPropertyOptional({ default: 'value' }) @IsOptional() @IsString() @Length(1, 200) valueColumn?: string;

  @ApiPropertyOptional({ description: "Where it differs from the tower's" })
  @IsOptional()
  @IsLoggerClock()
  clock?: string;

  @ApiPropertyOptional({ enum: stamps, description: "Where it differs from the tower's" })
  @IsOptional()
  @IsIn(stamps, { message: `stamp must be one of ${stamps.join(', ')}` })
  stamp?: (typeof stamps)[number];

  @ApiPropertyOptional({
    enum: repeatedHours,
    default: 'refuse',
    description: 'A civil time that happens twice',
  })
  @IsOptional()
  @IsIn(repeatedHours, { message: `repeatedHour must be one of ${repeatedHours.join(', ')}` })
  repeatedHour?: RepeatedHour;

  @ApiPropertyOptional({
    enum: missingHours,
    default: 'refuse',
    description: 'A civil time that does not exist',
  })
  @IsOptional()
  @IsIn(missingHours, { message: `missingHour must be one of ${missingHours.join(', ')}` })
  missingHour?: MissingHour;

  @ApiPropertyOptional({ description: 'Spreadsheets: the sheet; left out: the first that is not hidden' })
  @IsOptional()
  @IsString()
  @Length(1, 100)
  sheet?: string;
}

import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  IsArray,
  IsIn,
  IsInt,
  IsObject,
  IsOptional,
  IsString,
  Length,
  Matches,
  Max,
  MaxLength,
  Min,
  ValidateIf,
  ValidateNested,
} from 'class-validator';
import { toIso } from '../../common/instants';
import type { Source } from '../models/source.model';
import { IsLoggerClock } from './is-logger-clock';
import { stamps } from './tower.dto';

const formats = ['wide', 'long'] as const;
const timeForms = ['iso', 'day/month/year', 'month/day/year', 'epoch-seconds'] as const;

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

  @ApiPropertyOptional({ default: 'time' }) @IsOptional() @IsString() @Length(1, 200) timeColumn?: string;

  @ApiPropertyOptional({ enum: timeForms, default: 'iso' })
  @IsOptional()
  @IsIn(timeForms, { message: `timeForm must be one of ${timeForms.join(', ')}` })
  timeForm?: (typeof timeForms)[number];

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
}

/** What is needed to add a source. */
export class SourceInput {
  @ApiProperty({ enum: ['folder', 'push'] })
  @IsIn(['folder', 'push'], { message: 'kind must be folder or push' })
  kind!: 'folder' | 'push';

  @ApiPropertyOptional({ description: "A file or folder beneath the loggers' folder" })
  @ValidateIf((source: SourceInput) => source.kind === 'folder')
  @IsString({ message: "path must name a file or folder beneath the loggers' folder" })
  @Matches(/^(?!\/)(?!.*(^|\/)\.\.(\/|$)).+$/, {
    message: "path must stay beneath the loggers' folder, without a leading / or ..",
  })
  @MaxLength(300)
  path?: string;

  @ApiPropertyOptional({ type: MappingInput })
  @IsOptional()
  @ValidateNested()
  @Type(() => MappingInput)
  mapping?: MappingInput;

  @ApiPropertyOptional({ default: 60 })
  @IsOptional()
  @IsInt()
  @Min(10, { message: 'intervalSeconds must be 10 or more' })
  @Max(86_400)
  intervalSeconds?: number;
}

/** A source as the API shows it. */
@ApiSchema({ name: 'Source' })
export class SourceDto {
  @ApiProperty() id!: number;
  @ApiProperty() towerId!: number;
  @ApiProperty({ enum: ['folder', 'push'] }) kind!: 'folder' | 'push';
  @ApiProperty({ type: String, nullable: true }) path!: string | null;
  @ApiProperty({ type: MappingInput }) mapping!: MappingInput;
  @ApiProperty() intervalSeconds!: number;
  @ApiProperty({ type: String, nullable: true }) lastAt!: string | null;
  @ApiProperty({
    type: String,
    nullable: true,
    description: 'What the last collection gave, or why it failed',
  })
  lastResult!: string | null;
  @ApiProperty({ description: 'Failures in a row' }) failures!: number;
  @ApiProperty({ type: String, nullable: true }) nextAt!: string | null;
}

const orNull = (epochS: number | null): string | null => (epochS === null ? null : toIso(epochS));

/** A stored source in the API's shape. */
export function showSource(source: Source): SourceDto {
  const { id, towerId, kind, path, lastResult, failures } = source;
  return {
    ...{ id, towerId, kind, path: path ?? null, lastResult: lastResult ?? null, failures: failures ?? 0 },
    mapping: JSON.parse(source.mapping) as MappingInput,
    intervalSeconds: source.intervalS,
    lastAt: orNull(source.lastAt ?? null),
    nextAt: orNull(source.nextAt ?? null),
  };
}

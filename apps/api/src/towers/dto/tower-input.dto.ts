import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import {
  IsBoolean,
  IsIn,
  IsInt,
  IsNumber,
  IsOptional,
  IsString,
  Length,
  Matches,
  Max,
  MaxLength,
  Min,
} from 'class-validator';
import { IsLoggerClock } from './is-logger-clock';
import { inversionForms, screenings, stamps } from './tower.dto';

/** What is needed to make a tower. */
export class TowerInput {
  @ApiPropertyOptional()
  @IsOptional()
  @Matches(/^[a-z0-9]+(-[a-z0-9]+)*$/, { message: 'slug must be small letters, digits and single hyphens' })
  @MaxLength(60)
  slug?: string;

  @ApiProperty() @IsString() @Length(1, 80, { message: 'name must have 1 to 80 characters' }) name!: string;

  @ApiProperty({ description: 'Ground above sea level, m' })
  @IsNumber({}, { message: 'elevationM must be the height of the ground above sea level in metres' })
  @Min(-500)
  @Max(9000)
  elevationM!: number;

  @ApiProperty() @IsNumber() @Min(-90) @Max(90) latitude!: number;
  @ApiProperty() @IsNumber() @Min(-180) @Max(180) longitude!: number;

  @ApiProperty({ description: "The logger's interval" })
  @IsInt({ message: 'intervalMinutes must be whole minutes' })
  @Min(1)
  @Max(60, { message: 'intervalMinutes must be 60 or less' })
  intervalMinutes!: number;

  @ApiPropertyOptional({
    description: 'A whole multiple of the interval; 15 where the interval divides 15, else the interval',
  })
  @IsOptional()
  @IsInt({ message: 'blockMinutes must be whole minutes' })
  @Min(1)
  @Max(60, { message: 'blockMinutes must be 60 or less' })
  blockMinutes?: number;

  @ApiPropertyOptional({ type: Number, nullable: true })
  @IsOptional()
  @IsInt()
  @Min(1)
  staleLimitMinutes?: number | null;

  @ApiPropertyOptional({ default: 'UTC', description: 'UTC, a fixed offset such as -07:00, or an IANA zone' })
  @IsOptional()
  @IsLoggerClock()
  clock?: string;

  @ApiPropertyOptional({ enum: stamps, default: 'end' })
  @IsOptional()
  @IsIn(stamps, { message: `stamp must be one of ${stamps.join(', ')}` })
  stamp?: (typeof stamps)[number];

  @ApiPropertyOptional({ enum: screenings, default: 'full' })
  @IsOptional()
  @IsIn(screenings, { message: `screening must be one of ${screenings.join(', ')}` })
  screening?: (typeof screenings)[number];

  @ApiPropertyOptional({ enum: inversionForms, default: 'sensor-aware' })
  @IsOptional()
  @IsIn(inversionForms, { message: `inversionForm must be one of ${inversionForms.join(', ')}` })
  inversionForm?: (typeof inversionForms)[number];

  @ApiPropertyOptional({ default: 0, description: 'Decreases thinner than this are passed over, m' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  @Max(500)
  embedDepthM?: number;
}

/** What may be changed of a tower; `version` is the one that was read. */
export class TowerPatch extends PartialType(TowerInput) {
  @ApiProperty({ description: 'The version that was read' })
  @IsInt({ message: 'version must be the version that was read' })
  version!: number;

  @ApiPropertyOptional({
    description: 'true sets the tower aside: its readings stay, new ones are not taken',
  })
  @IsOptional()
  @IsBoolean()
  retired?: boolean;
}

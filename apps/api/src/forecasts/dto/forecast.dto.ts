import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsNumber, IsOptional, IsString, Length, Matches, Max, MaxLength, Min } from 'class-validator';

const DAY = /^\d{4}-\d{2}-\d{2}$/;

/** Which forecasts are wanted; days as 2026-01-31, both included. */
export class ForecastsQuery {
  @ApiProperty()
  @Type(() => Number)
  @IsInt()
  districtId!: number;

  @ApiProperty()
  @Matches(DAY, { message: 'from must be a day such as 2026-01-31' })
  from!: string;

  @ApiProperty()
  @Matches(DAY, { message: 'to must be a day such as 2026-01-31' })
  to!: string;
}

/** For which district. */
export class SkillQuery {
  @ApiProperty()
  @Type(() => Number)
  @IsInt()
  districtId!: number;
}

/** A forecast: the night that begins on its day, and the day after. What is left out is not said. */
export class ForecastInput {
  @ApiProperty() @IsInt() districtId!: number;

  @ApiProperty({ description: 'The day whose evening it begins with, as 2026-01-31' })
  @Matches(DAY, { message: 'day must be a day such as 2026-01-31' })
  day!: string;

  @ApiPropertyOptional({ description: 'Lowest temperature of the night, noon to noon, °C' })
  @IsOptional()
  @IsNumber({}, { message: 'lowC must be a number of °C' })
  @Min(-80)
  @Max(60)
  lowC?: number;

  @ApiPropertyOptional({ description: 'Cloud of the night, % of the sky' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  @Max(100)
  cloudPercent?: number;

  @ApiPropertyOptional({ description: 'Mean wind of the night, m/s' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  @Max(75)
  windMPerS?: number;

  @ApiPropertyOptional({ description: 'Highest temperature of the day after, °C' })
  @IsOptional()
  @IsNumber({}, { message: 'highC must be a number of °C' })
  @Min(-80)
  @Max(60)
  highC?: number;

  @ApiPropertyOptional({ description: 'Mixing height of the day after, m above ground' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  @Max(10_000)
  mixingHeightM?: number;

  @ApiPropertyOptional() @IsOptional() @IsString() @MaxLength(500) note?: string;
}

/** A table of forecasts as text. */
export class ForecastTableInput {
  @ApiProperty({
    description:
      'Comma-separated with a header: district (its name or address part), day, and any of low_c, cloud_percent, wind_m_per_s, high_c, mixing_height_m, note',
  })
  @IsString()
  @Length(1, 400_000, { message: 'The table is empty, or longer than 400,000 characters.' })
  text!: string;
}

/** What a forecast's night and day turned out to be. */
@ApiSchema({ name: 'ForecastOutcome' })
export class OutcomeDto {
  @ApiProperty({ type: Number, nullable: true }) lowC!: number | null;
  @ApiProperty({ type: Number, nullable: true }) windMPerS!: number | null;
  @ApiProperty({ type: Number, nullable: true }) highC!: number | null;
  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'By the parcel method from the morning and the high',
  })
  mixingAtLeastM!: number | null;
  @ApiProperty({ type: Number, nullable: true, description: 'null: open, above the tower' })
  mixingAtMostM!: number | null;
  @ApiProperty() towerName!: string;
  @ApiProperty({ description: 'Hours of the night that were measured' }) hours!: number;
}

const origins = ['entered', 'uploaded', 'demo'] as const;

/** A forecast, its newest entry, with what came of it. */
@ApiSchema({ name: 'Forecast' })
export class ForecastDto {
  @ApiProperty() id!: number;
  @ApiProperty() districtId!: number;
  @ApiProperty() day!: string;
  @ApiProperty({ type: Number, nullable: true }) lowC!: number | null;
  @ApiProperty({ type: Number, nullable: true }) cloudPercent!: number | null;
  @ApiProperty({ type: Number, nullable: true }) windMPerS!: number | null;
  @ApiProperty({ type: Number, nullable: true }) highC!: number | null;
  @ApiProperty({ type: Number, nullable: true }) mixingHeightM!: number | null;
  @ApiProperty() note!: string;
  @ApiProperty({ enum: origins }) origin!: (typeof origins)[number];
  @ApiProperty() enteredAt!: string;
  @ApiProperty({ type: String, nullable: true }) by!: string | null;
  @ApiProperty({ description: 'How often it was entered; the newest counts, the others are kept' })
  entries!: number;
  @ApiProperty({ type: OutcomeDto, nullable: true }) outcome!: OutcomeDto | null;
}

/** How forecasts of one quantity did. */
@ApiSchema({ name: 'Skill' })
export class SkillDto {
  @ApiProperty({ description: 'Forecasts with an outcome' }) n!: number;
  @ApiProperty({ type: Number, nullable: true, description: 'Mean of forecast minus outcome; null: too few' })
  meanError!: number | null;
  @ApiProperty({ type: Number, nullable: true, description: 'Mean of its size; null: too few' })
  meanAbsoluteError!: number | null;
}

/** How the forecasts of the last 30 days did that were entered before their night. */
@ApiSchema({ name: 'ForecastSkill' })
export class ForecastSkillDto {
  @ApiProperty({ type: SkillDto }) lowC!: SkillDto;
  @ApiProperty({ type: SkillDto }) highC!: SkillDto;
  @ApiProperty({ type: SkillDto }) windMPerS!: SkillDto;
  @ApiProperty({ description: 'Fewer than this are too few to say' }) least!: number;
}

/** A row of a table that was not taken. */
@ApiSchema({ name: 'RefusedForecast' })
export class RefusedForecastDto {
  @ApiProperty() row!: number;
  @ApiProperty({ description: 'Names the row, the column and the cure' }) text!: string;
}

/** What a table of forecasts gave. */
@ApiSchema({ name: 'ForecastTableResult' })
export class ForecastTableResultDto {
  @ApiProperty() taken!: number;
  @ApiProperty({ description: 'The same as what counts already; not entered again' }) repeated!: number;
  @ApiProperty({ type: [RefusedForecastDto] }) refused!: RefusedForecastDto[];
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsBoolean, IsNumber, IsString, Length, Max, Min, ValidateIf, ValidateNested } from 'class-validator';

const number = (what: string) => ({ message: `$property must be ${what}, as a number` });
const orNull = ValidateIf((_, value) => value !== null);

/** A lowest and a highest value, both still accepted. */
@ApiSchema({ name: 'LimitRange' })
export class LimitRangeDto {
  @ApiProperty() @IsNumber({}, number('the lowest value')) lowest!: number;
  @ApiProperty() @IsNumber({}, number('the highest value')) highest!: number;
}

const fourth = {
  message: 'Give all four differences to the level below, each above 0, or none of them.',
};

/** What differs more from the level below is suspect. */
@ApiSchema({ name: 'LevelDifference' })
export class LevelDifferenceDto {
  @ApiProperty({ description: 'Warmer than the level below by more, °C' })
  @Min(0.01, fourth)
  riseC!: number;

  @ApiProperty({ description: 'Colder than the level below by more, °C' })
  @Min(0.01, fourth)
  fallC!: number;

  @ApiProperty({ description: 'Warmer by day by more, °C/m' })
  @Min(0.001, fourth)
  risePerMetreByDayC!: number;

  @ApiProperty({ description: 'Colder at night by more, °C/m' })
  @Min(0.001, fourth)
  fallPerMetreAtNightC!: number;
}

/** The limits of a sensor's checks, in its unit; null switches a check off. */
@ApiSchema({ name: 'CheckLimits' })
export class CheckLimitsDto {
  @ApiProperty({
    type: LimitRangeDto,
    nullable: true,
    description: 'What is expected here; beyond it: suspect',
  })
  @orNull
  @ValidateNested()
  @Type(() => LimitRangeDto)
  plausible!: LimitRangeDto | null;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'A single reading further off than this: failed',
  })
  @orNull
  @IsNumber({}, number('a difference above 0'))
  @Min(0.01, { message: 'spike must be above 0; null switches the check off' })
  spike!: number | null;

  @ApiProperty({ type: Number, nullable: true, description: 'The very same value for so many hours: failed' })
  @orNull
  @IsNumber({}, number('1 to 12 hours'))
  @Min(1, { message: 'stuckHours must be 1 to 12; null switches the check off' })
  @Max(12, { message: 'stuckHours must be 1 to 12; null switches the check off' })
  stuckHours!: number | null;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'Further than this from the median of the neighbouring towers: suspect',
  })
  @orNull
  @IsNumber({}, number('a difference above 0'))
  @Min(0.01, { message: 'neighbourDifference must be above 0; null switches the check off' })
  neighbourDifference!: number | null;

  @ApiProperty({
    type: LevelDifferenceDto,
    nullable: true,
    description: 'Air temperature alone: what is unusual from the level below to this one; suspect',
  })
  @orNull
  @ValidateNested()
  @Type(() => LevelDifferenceDto)
  levelDifference!: LevelDifferenceDto | null;

  @ApiProperty({ description: 'Whether changes faster than usual are suspect' })
  @IsBoolean({ message: 'fastChanges must be true or false' })
  fastChanges!: boolean;

  @ApiProperty({ description: 'Whether hours without any change to speak of are suspect' })
  @IsBoolean({ message: 'steadiness must be true or false' })
  steadiness!: boolean;
}

/** New limits of a sensor, and why. */
export class LimitsInput extends CheckLimitsDto {
  @ApiProperty({ description: 'Why; it is kept with your name' })
  @IsString()
  @Length(3, 500, { message: 'reason must say why, in 3 to 500 characters' })
  reason!: string;
}

/** A sensor's limits beside the usual ones of what it measures. */
@ApiSchema({ name: 'SensorLimits' })
export class SensorLimitsDto {
  @ApiProperty() sensorId!: number;
  @ApiProperty() sensorName!: string;
  @ApiProperty() unit!: string;
  @ApiProperty({ type: LimitRangeDto, description: 'What is possible; beyond it: failed, always' })
  physical!: LimitRangeDto;
  @ApiProperty({ type: CheckLimitsDto }) limits!: CheckLimitsDto;
  @ApiProperty({ type: CheckLimitsDto }) usual!: CheckLimitsDto;
}

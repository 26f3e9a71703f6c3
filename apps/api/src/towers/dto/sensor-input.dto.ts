import { ApiProperty, ApiPropertyOptional, OmitType, PartialType } from '@nestjs/swagger';
import {
  IsBoolean,
  IsIn,
  IsISO8601,
  IsNumber,
  IsOptional,
  IsString,
  Length,
  Max,
  MaxLength,
  Min,
} from 'class-validator';
import { sensorQuantities, type SensorQuantity } from '../quantities';

/** What is needed to add a sensor. Its uncertainty comes from the data sheet: one of `sigma` or `limits`. */
export class SensorInput {
  @ApiProperty({ description: "The column name of the sensor's readings" })
  @IsString()
  @Length(1, 120, { message: 'name must have 1 to 120 characters' })
  name!: string;

  @ApiProperty({ enum: sensorQuantities })
  @IsIn(sensorQuantities, { message: `quantity must be one of ${sensorQuantities.join(', ')}` })
  quantity!: SensorQuantity;

  @ApiPropertyOptional({ description: "The quantity's unit; it may be left out" })
  @IsOptional()
  @IsString()
  unit?: string;

  @ApiProperty({ description: 'Above ground, m' })
  @IsNumber({}, { message: 'heightM must be the height above ground in metres' })
  @Min(0)
  @Max(2000)
  heightM!: number;

  @ApiPropertyOptional({ description: 'One standard deviation, in the unit' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  sigma?: number;

  @ApiPropertyOptional({ description: 'Limits as the data sheet gives them (± this), in the unit' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  limits?: number;

  @ApiPropertyOptional({ description: 'Standard deviation of the difference to its matched sensor, °C' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  pairSigma?: number;

  @ApiPropertyOptional({ default: 0, description: 'corrected = gain × reading + offset' })
  @IsOptional()
  @IsNumber()
  offset?: number;

  @ApiPropertyOptional({ default: 1 }) @IsOptional() @IsNumber() gain?: number;

  @ApiPropertyOptional({
    description: 'Holds for readings after this instant; from the beginning when left out',
  })
  @IsOptional()
  @IsISO8601({ strict: true }, { message: 'from must be an instant such as 2026-01-31T05:10:00Z' })
  from?: string;

  @ApiPropertyOptional() @IsOptional() @IsString() @MaxLength(500) note?: string;
}

/** A change of a sensor from an instant on; what is left out stays as it was. */
export class SensorPatch extends PartialType(OmitType(SensorInput, ['quantity', 'unit'] as const)) {
  @ApiPropertyOptional({
    description: 'true sets the sensor aside: its readings stay, new ones are not taken',
  })
  @IsOptional()
  @IsBoolean()
  retired?: boolean;
}

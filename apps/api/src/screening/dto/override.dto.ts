import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsIn, IsInt, IsISO8601, IsString, Length } from 'class-validator';

const instant = { message: '$property must be an instant with its offset, such as 2026-01-31T05:10:00Z' };

/** A span of a sensor that a person wants to set. */
export class OverrideInput {
  @ApiProperty() @IsInt({ message: 'sensorId must be the id of a sensor' }) sensorId!: number;

  @ApiProperty({ description: 'End of the first reading of the span' })
  @IsISO8601({ strict: true }, instant)
  from!: string;

  @ApiProperty({ description: 'End of the last reading of the span' })
  @IsISO8601({ strict: true }, instant)
  to!: string;

  @ApiProperty({ enum: ['valid', 'failed'] })
  @IsIn(['valid', 'failed'], { message: 'quality must be valid or failed' })
  quality!: 'valid' | 'failed';

  @ApiProperty({ description: 'Why; it is kept with your name' })
  @IsString()
  @Length(3, 500, { message: 'reason must say why, in 3 to 500 characters' })
  reason!: string;
}

/** Whose spans are wanted. */
export class OverridesQuery {
  @ApiProperty()
  @Type(() => Number)
  @IsInt({ message: 'towerId must be the id of a tower' })
  towerId!: number;
}

/** A span that a person has set. */
@ApiSchema({ name: 'Override' })
export class OverrideDto {
  @ApiProperty() id!: number;
  @ApiProperty() sensorId!: number;
  @ApiProperty() sensorName!: string;
  @ApiProperty() from!: string;
  @ApiProperty() to!: string;
  @ApiProperty({ enum: ['valid', 'failed'] }) quality!: 'valid' | 'failed';
  @ApiProperty() reason!: string;
  @ApiProperty() by!: string;
  @ApiProperty() at!: string;
  @ApiProperty({ type: String, nullable: true }) undoneBy!: string | null;
  @ApiProperty({ type: String, nullable: true }) undoneAt!: string | null;
}

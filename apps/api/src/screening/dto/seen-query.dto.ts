import { checkBits, type Check } from '@lidwatch/contracts';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsIn, IsInt, IsISO8601, IsOptional, Matches } from 'class-validator';
import { PageQuery } from '../../common/paging';

const instant = { message: '$property must be an instant with its offset, such as 2026-01-31T05:10:00Z' };
const sensorId = { message: 'sensorId must be the id of a sensor of this tower' };
const day = { message: '$property must be a day such as 2026-01-31' };
/** Every check by name. */
export const checks = Object.keys(checkBits) as Check[];

/** The days a calendar is wanted for, both included, in the tower's zone. */
export class CalendarQuery {
  @ApiProperty({ example: '2026-01-01' }) @Matches(/^\d{4}-\d{2}-\d{2}$/, day) from!: string;
  @ApiProperty({ example: '2026-01-31' }) @Matches(/^\d{4}-\d{2}-\d{2}$/, day) to!: string;
}

/** Which flagged spans are wanted: of readings whose interval ends in (from, to]. */
export class FlagsQuery extends PageQuery {
  @ApiProperty() @IsISO8601({ strict: true }, instant) from!: string;
  @ApiProperty() @IsISO8601({ strict: true }, instant) to!: string;
  @ApiPropertyOptional() @IsOptional() @Type(() => Number) @IsInt(sensorId) sensorId?: number;

  @ApiPropertyOptional({ enum: checks })
  @IsOptional()
  @IsIn(checks, { message: `check must be one of ${checks.join(', ')}` })
  check?: Check;

  @ApiPropertyOptional({
    enum: ['suspect', 'failed'],
    description: 'The worst of the span; any when left out',
  })
  @IsOptional()
  @IsIn(['suspect', 'failed'], { message: 'quality must be suspect or failed' })
  quality?: 'suspect' | 'failed';
}

/** Which readings are wanted: those whose interval ends in (from, to]. */
export class RawQuery {
  @ApiProperty() @IsISO8601({ strict: true }, instant) from!: string;
  @ApiProperty() @IsISO8601({ strict: true }, instant) to!: string;
  @ApiPropertyOptional() @IsOptional() @Type(() => Number) @IsInt(sensorId) sensorId?: number;
}

import { ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsISO8601, IsOptional, Max, Min } from 'class-validator';

const instant = { message: '$property must be an instant with its offset, such as 2026-01-31T05:10:00Z' };

/** Which profiles of a tower are wanted: those whose block ends in [from, to]. */
export class ProfilesQuery {
  @ApiPropertyOptional() @IsOptional() @IsISO8601({ strict: true }, instant) from?: string;
  @ApiPropertyOptional() @IsOptional() @IsISO8601({ strict: true }, instant) to?: string;

  @ApiPropertyOptional({ minimum: 1, maximum: 2000, default: 500 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(2000, { message: 'limit must be 2000 or less; ask again from `next`' })
  limit: number = 500;
}

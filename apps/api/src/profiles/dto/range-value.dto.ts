import { isKnown, isNotKnown, type Quantity } from '@lidwatch/atmosphere';
import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';

/** What is known of a number; exactly one of the fields is there. Silence is `notKnown` with its reason, never 0. */
@ApiSchema({ name: 'RangeValue' })
export class RangeValue {
  @ApiPropertyOptional() exactly?: number;
  @ApiPropertyOptional() atLeast?: number;
  @ApiPropertyOptional() atMost?: number;
  @ApiPropertyOptional({ type: [Number], minItems: 2, maxItems: 2 }) between?: [number, number];
  @ApiPropertyOptional({ description: 'The reason, in plain words' }) notKnown?: string;
}

/** A quantity as the API shows it. */
export function showRange(quantity: Quantity): RangeValue {
  const { lo, hi, reason } = quantity;
  if (isKnown(quantity)) return { exactly: lo };
  if (isNotKnown(quantity)) return { notKnown: reason ?? 'nothing was measured' };
  if (hi === Infinity) return { atLeast: lo };
  return lo === -Infinity ? { atMost: hi } : { between: [lo, hi] };
}

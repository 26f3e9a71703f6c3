import type { Truth } from '@lidwatch/atmosphere';
import { NOTICE_KINDS } from '@lidwatch/rules';
import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { IsISO8601 } from 'class-validator';
import { NoticeBrief } from '../../notices/dto/notice.dto';
import { RangeValue } from '../../profiles/dto/range-value.dto';

const instant = { format: 'date-time' };

/** The span a history is wanted for. */
export class HistoryQuery {
  @ApiProperty(instant)
  @IsISO8601({ strict: true }, { message: 'from must be an instant such as 2026-01-15T00:00:00Z' })
  from!: string;

  @ApiProperty(instant)
  @IsISO8601({ strict: true }, { message: 'to must be an instant such as 2026-01-22T00:00:00Z' })
  to!: string;
}

/** One block of the history, or the strongest of a step. */
@ApiSchema({ name: 'HistoryPoint' })
export class HistoryPointDto {
  @ApiProperty(instant) t!: string;
  @ApiProperty({ type: RangeValue }) strength!: RangeValue;
  @ApiProperty({ type: Number, nullable: true, description: 'Strength within the tower, °C' }) within!:
    number | null;
  @ApiProperty({ enum: ['true', 'false', 'not known'] }) sure!: Truth;
  @ApiProperty({ type: Number, nullable: true }) speakerId!: number | null;
  @ApiPropertyOptional() reason?: string;
  @ApiPropertyOptional({
    ...{ type: Number, nullable: true },
    description: 'Where a point stands for the strongest block of a step: the least within the tower, °C',
  })
  lowest?: number | null;
  @ApiPropertyOptional({ ...instant, description: 'When the strongest block of the step ended' })
  strongestAt?: string;
}

/** A limit of the rule in force on the inversion's strength. */
export class HistoryLimit {
  @ApiProperty({ enum: NOTICE_KINDS }) kind!: string;
  @ApiProperty({ enum: ['begin', 'end'] }) act!: string;
  @ApiProperty() measure!: string;
  @ApiProperty() op!: string;
  @ApiProperty() value!: number;
  @ApiProperty() heldMinutes!: number;
}

/** From sunset to sunrise. */
export class NightSpan {
  @ApiProperty(instant) from!: string;
  @ApiProperty(instant) to!: string;
}

/** A district's inversion strength over a span, with the rule's limits and the notices of that time. */
export class DistrictHistory {
  @ApiProperty() districtId!: number;
  @ApiProperty() timeZone!: string;
  @ApiProperty(instant) from!: string;
  @ApiProperty(instant) to!: string;
  @ApiProperty({
    description: 'Minutes a point stands for; more than a block where every block would be too many',
  })
  stepMinutes!: number;
  @ApiProperty({ type: [HistoryPointDto] }) points!: HistoryPointDto[];
  @ApiProperty({ type: [HistoryLimit] }) limits!: HistoryLimit[];
  @ApiProperty({ type: [NoticeBrief] }) notices!: NoticeBrief[];
  @ApiProperty({ type: [NightSpan] }) nights!: NightSpan[];
}

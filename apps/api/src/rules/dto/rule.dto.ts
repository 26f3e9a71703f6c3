import { NOTICE_KINDS, type RuleDefinition } from '@lidwatch/rules';
import { describeCondition } from '@lidwatch/rules';
import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { toIso } from '../../common/instants';
import type { Rule } from '../models/rule.model';

/** A rule for one kind of notice, in lines for people. */
export class RuleInWords {
  @ApiProperty({ enum: NOTICE_KINDS }) kind!: string;
  @ApiProperty({ type: [String] }) begin!: string[];
  @ApiProperty({ type: [String] }) end!: string[];
}

/** A version of a district's rule. */
@ApiSchema({ name: 'RuleRow' })
export class RuleDto {
  @ApiProperty() id!: number;
  @ApiProperty() districtId!: number;
  @ApiProperty() version!: number;
  @ApiProperty({ enum: ['draft', 'in force', 'past'] }) state!: string;
  @ApiProperty() note!: string;
  @ApiProperty({ type: 'object', additionalProperties: true }) body!: RuleDefinition;
  @ApiProperty({ type: [RuleInWords] }) inWords!: RuleInWords[];
  @ApiProperty() sha256!: string;
  @ApiProperty({ format: 'date-time' }) createdAt!: string;
  @ApiPropertyOptional({ format: 'date-time' }) fromAt?: string;
  @ApiPropertyOptional({ format: 'date-time' }) toAt?: string;
}

/** A stored version in the API's shape. */
export function showRule(rule: Rule): RuleDto {
  const { id, districtId, version, state, note, sha256, createdAt, fromAt, toAt } = rule;
  const body = JSON.parse(rule.body) as RuleDefinition;
  const inWords = NOTICE_KINDS.flatMap((kind): RuleInWords[] => {
    const part = body[kind];
    if (!part) return [];
    return [{ kind, begin: describeCondition(part.begin, 'en'), end: describeCondition(part.end, 'en') }];
  });
  return {
    ...{ id, districtId, version, state, note, body, inWords, sha256, createdAt: toIso(createdAt) },
    ...(fromAt !== null && { fromAt: toIso(fromAt) }),
    ...(toAt !== null && { toAt: toIso(toAt) }),
  };
}

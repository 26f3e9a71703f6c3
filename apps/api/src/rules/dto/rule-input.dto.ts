import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsObject, IsOptional, IsString, MaxLength } from 'class-validator';

/** A draft of a district's rule. Its body is checked by the rule language itself, which names each fault. */
export class RuleInput {
  @ApiProperty({ type: 'object', additionalProperties: true, description: 'advisory, burnBan or both' })
  @IsObject({ message: 'body must be a rule: an object with advisory, burnBan or both' })
  body!: Record<string, unknown>;

  @ApiPropertyOptional({ description: 'Why this version; for the record' })
  @IsOptional()
  @IsString()
  @MaxLength(2000)
  note: string = '';
}

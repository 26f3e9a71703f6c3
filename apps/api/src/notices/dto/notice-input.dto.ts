import { noticeKinds, type NoticeKind } from '@lidwatch/contracts';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsIn, IsInt, IsISO8601, IsOptional, IsString, Length, MaxLength } from 'class-validator';
import { PageQuery } from '../../common/paging';
import { outboxStates, type OutboxState } from '../../outbox/dto/outbox-row.dto';
import { noticeStates } from './notice.dto';

const instant = { strict: true, strictSeparator: true };

/** What a notice by hand is to say. */
export class NoticeDraft {
  @ApiProperty() @IsInt() districtId!: number;
  @ApiProperty({ enum: noticeKinds }) @IsIn(noticeKinds) kind!: NoticeKind;

  @ApiProperty({ format: 'date-time' })
  @IsISO8601(instant, { message: 'expiresAt must be an instant such as 2026-01-15T11:00:00-07:00' })
  expiresAt!: string;

  @ApiProperty({ description: 'Why it is issued without a proposal; kept, not sent' })
  @IsString()
  @Length(5, 1000, { message: 'Say why in 5 to 1,000 characters.' })
  reason!: string;
}

/** What every issuing or ending carries: the text that was seen, and a key so that a second click does nothing. */
export class Commitment {
  @ApiProperty() @IsString() @MaxLength(64) previewHash!: string;
  @ApiPropertyOptional({ description: 'Again, for a burn ban' })
  @IsOptional()
  @IsString()
  @MaxLength(128)
  password?: string;
  @ApiProperty({ description: 'Chosen by the client, the same for repeats of one click' })
  @IsString()
  @Length(8, 64)
  requestKey!: string;
}

/** A notice by hand, to be issued. */
export class NoticeByHand extends NoticeDraft {
  @ApiProperty() @IsString() @MaxLength(64) previewHash!: string;
  @ApiPropertyOptional() @IsOptional() @IsString() @MaxLength(128) password?: string;
  @ApiProperty() @IsString() @Length(8, 64) requestKey!: string;
}

/** A notice to be ended before its written end. */
export class NoticeEnding extends Commitment {
  @ApiProperty() @IsInt() version!: number;
  @ApiProperty()
  @IsString()
  @Length(5, 1000, { message: 'Say why in 5 to 1,000 characters.' })
  reason!: string;
}

/** Which notices of the log are wanted. */
export class NoticeQuery extends PageQuery {
  @ApiPropertyOptional() @IsOptional() @Type(() => Number) @IsInt() districtId?: number;
  @ApiPropertyOptional({ enum: noticeKinds }) @IsOptional() @IsIn(noticeKinds) kind?: NoticeKind;
  @ApiPropertyOptional({ enum: noticeStates })
  @IsOptional()
  @IsIn(noticeStates)
  state?: (typeof noticeStates)[number];
  @ApiPropertyOptional({ description: 'Issued at or after' }) @IsOptional() @IsISO8601(instant) from?: string;
  @ApiPropertyOptional({ description: 'Issued before' }) @IsOptional() @IsISO8601(instant) to?: string;
  @ApiPropertyOptional({ description: 'Words in reference, reason or texts' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  q?: string;
}

/** Which messages of a notice are wanted. */
export class DeliveryQuery extends PageQuery {
  @ApiPropertyOptional({ enum: outboxStates }) @IsOptional() @IsIn(outboxStates) state?: OutboxState;
  @ApiPropertyOptional({ enum: ['email', 'sms'] }) @IsOptional() @IsIn(['email', 'sms']) channel?:
    'email' | 'sms';
}

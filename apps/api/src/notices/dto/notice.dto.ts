import { noticeKinds, type NoticeKind, type NoticeState } from '@lidwatch/contracts';
import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { pageOf } from '../../common/paging';
import { outboxStates, type OutboxState } from '../../outbox/dto/outbox-row.dto';
import { EvidenceDto } from '../../rules/dto/evidence.dto';
import { NoticeTexts } from './notice-text.dto';

export const noticeStates = ['in force', 'ended', 'replaced'] as const satisfies readonly NoticeState[];

/** A notice in one line. */
@ApiSchema({ name: 'NoticeBrief' })
export class NoticeBrief {
  @ApiProperty() id!: number;
  @ApiProperty({ example: 'MF-26-017' }) ref!: string;
  @ApiProperty() districtId!: number;
  @ApiProperty() districtName!: string;
  @ApiProperty({ enum: noticeKinds }) kind!: NoticeKind;
  @ApiProperty({ enum: noticeStates }) state!: NoticeState;
  @ApiProperty({ format: 'date-time' }) issuedAt!: string;
  @ApiProperty({ description: 'Name of the officer' }) issuedBy!: string;
  @ApiProperty({ format: 'date-time' }) effectiveAt!: string;
  @ApiProperty({ format: 'date-time', description: 'Written end' }) expiresAt!: string;
  @ApiPropertyOptional({ format: 'date-time' }) endedAt?: string;
  @ApiPropertyOptional({ description: 'Who ended it; absent when it came to its written end' })
  endedBy?: string;
  @ApiPropertyOptional() endReason?: string;
  @ApiProperty() version!: number;
}

/** One page of the notice log. */
@ApiSchema({ name: 'NoticePage' })
export class NoticePage extends pageOf(NoticeBrief) {}

/** Something that happened to a notice. */
@ApiSchema({ name: 'NoticeEvent' })
export class NoticeEventDto {
  @ApiProperty() seq!: number;
  @ApiProperty({ enum: ['issued', 'ended', 'expired', 'replaced'] }) kind!: string;
  @ApiProperty({ format: 'date-time' }) at!: string;
  @ApiProperty({ description: 'A name, or "the service"' }) by!: string;
  @ApiProperty() text!: string;
}

/** How many messages of a notice stand where, by channel. A text is delivered only by the provider's receipt. */
@ApiSchema({ name: 'DeliveryCount' })
export class DeliveryCount {
  @ApiProperty({ enum: ['email', 'sms'] }) channel!: 'email' | 'sms';
  @ApiProperty({ enum: outboxStates }) state!: OutboxState;
  @ApiProperty() count!: number;
}

/** A notice with everything that is known of it. */
@ApiSchema({ name: 'NoticeDetail' })
export class NoticeDetail extends NoticeBrief {
  @ApiProperty({ enum: ['proposal', 'by hand'] }) origin!: 'proposal' | 'by hand';
  @ApiProperty() reason!: string;
  @ApiProperty({ type: NoticeTexts }) texts!: NoticeTexts;
  @ApiPropertyOptional({ type: EvidenceDto }) evidence?: EvidenceDto;
  @ApiProperty({ type: [NoticeEventDto] }) events!: NoticeEventDto[];
  @ApiProperty({ type: [DeliveryCount] }) delivery!: DeliveryCount[];
}

import type { ProposalState } from '@lidwatch/contracts';
import { NOTICE_KINDS, type NoticeKind } from '@lidwatch/rules';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { pageOf } from '../../common/paging';
import { ProfileDto } from '../../profiles/dto/profile.dto';
import { EvidenceDto } from '../../rules/dto/evidence.dto';

/** States of a proposal. */
export const proposalStates = ['open', 'confirmed', 'declined', 'returned', 'issued', 'lapsed'] as const;

/** A proposal in a list. */
export class ProposalCard {
  @ApiProperty() id!: number;
  @ApiProperty() districtId!: number;
  @ApiProperty() districtName!: string;
  @ApiProperty({ enum: NOTICE_KINDS }) kind!: NoticeKind;
  @ApiProperty({ enum: ['begin', 'end'] }) act!: 'begin' | 'end';
  @ApiProperty({ enum: proposalStates }) state!: ProposalState;
  @ApiProperty({ format: 'date-time' }) openedAt!: string;
  @ApiProperty({ format: 'date-time', description: 'End of the block that was judged' }) tEnd!: string;
  @ApiProperty({ description: 'What decided, in one line' }) summary!: string;
  @ApiPropertyOptional() confirmedBy?: string;
  @ApiPropertyOptional({ format: 'date-time' }) confirmedAt?: string;
  @ApiPropertyOptional({ description: "The analyst's sentence for the officer" }) note?: string;
  @ApiPropertyOptional({ description: 'Why it was declined or returned, or why it lapsed' }) reason?: string;
  @ApiPropertyOptional() closedBy?: string;
  @ApiPropertyOptional({ format: 'date-time' }) closedAt?: string;
  @ApiPropertyOptional({ type: Number }) noticeId?: number;
  @ApiProperty() version!: number;
}

/** A page of proposals. */
export class ProposalPage extends pageOf(ProposalCard) {}

/** The rule that proposed. */
export class ProposalRule {
  @ApiProperty() id!: number;
  @ApiProperty() version!: number;
}

/** Something that happened to a proposal. */
export class HistoryEntry {
  @ApiProperty({ format: 'date-time' }) at!: string;
  @ApiProperty() by!: string;
  @ApiProperty() act!: string;
  @ApiProperty() text!: string;
}

/** A proposal with all that bears on the decision. */
export class ProposalDetail extends ProposalCard {
  @ApiProperty({ type: ProposalRule }) rule!: ProposalRule;
  @ApiProperty({ type: EvidenceDto }) evidence!: EvidenceDto;
  @ApiProperty({ type: ProfileDto, nullable: true }) profile!: ProfileDto | null;
  @ApiProperty({ type: [HistoryEntry] }) history!: HistoryEntry[];
  @ApiProperty({ format: 'date-time', description: 'The written end proposed for the notice' })
  suggestedExpiresAt!: string;
}

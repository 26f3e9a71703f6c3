import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsIn, IsInt, IsISO8601, IsOptional, IsString, Length, MaxLength } from 'class-validator';
import { PageQuery } from '../../common/paging';
import { proposalStates } from './proposal.dto';

const words = { message: 'Say why, in 3 to 2000 characters' };

/** Which proposals are wanted. */
export class ProposalQuery extends PageQuery {
  @ApiPropertyOptional({
    enum: [...proposalStates, 'waiting'],
    description: 'waiting: open, confirmed or returned',
  })
  @IsOptional()
  @IsIn([...proposalStates, 'waiting'])
  state?: (typeof proposalStates)[number] | 'waiting';

  @ApiPropertyOptional()
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  districtId?: number;
}

class Versioned {
  @ApiProperty({ description: 'The version that was read' })
  @IsInt({ message: 'version must be the version that was read' })
  version!: number;
}

/** An analyst's confirmation, with a sentence for the officer. */
export class ConfirmProposal extends Versioned {
  @ApiPropertyOptional() @IsOptional() @IsString() @MaxLength(2000) note: string = '';
}

/** Why a proposal is declined or sent back. */
export class RefuseProposal extends Versioned {
  @ApiProperty() @IsString() @Length(3, 2000, words) reason!: string;
}

/** Until when the notice is to hold, for a preview. */
export class PreviewProposal {
  @ApiPropertyOptional({ format: 'date-time', description: "The rule's longest validity when left out" })
  @IsOptional()
  @IsISO8601({ strict: true })
  expiresAt?: string;
}

/** An officer's decision to issue, bound to the text they saw. */
export class IssueProposal extends Versioned {
  @ApiProperty({ description: 'Hash of the preview that was read' })
  @IsString()
  @Length(8, 128)
  previewHash!: string;
  @ApiPropertyOptional({ format: 'date-time' }) @IsOptional() @IsISO8601({ strict: true }) expiresAt?: string;
  @ApiPropertyOptional({ description: 'Asked again for a burn ban' })
  @IsOptional()
  @IsString()
  @MaxLength(1000)
  password?: string;
  @ApiProperty({ description: 'Made by the client; the same key issues once however often it is sent' })
  @IsString()
  @Length(8, 100)
  requestKey!: string;
}

import { Body, Controller, Get, HttpCode, Param, ParseIntPipe, Post, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { NoticePreview } from '../notices/dto/notice-preview.dto';
import { NoticeDetail } from '../notices/dto/notice.dto';
import {
  ConfirmProposal,
  IssueProposal,
  PreviewProposal,
  ProposalQuery,
  RefuseProposal,
} from './dto/decisions.dto';
import { ProposalDetail, ProposalPage } from './dto/proposal.dto';
import { ProposalsService } from './proposals.service';

/** What the rules propose, and what people decide. */
@ApiTags('proposals')
@Controller('proposals')
export class ProposalsController {
  constructor(private readonly proposals: ProposalsService) {}

  /** Lists proposals, newest first; officers see the confirmed ones of their districts. */
  @Get()
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: ProposalPage })
  page(@Query() query: ProposalQuery, @CurrentUser() by: SignedIn): Promise<ProposalPage> {
    return this.proposals.page(query, by);
  }

  /** Shows one proposal with its evidence. */
  @Get(':id')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: ProposalDetail })
  detail(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<ProposalDetail> {
    return this.proposals.detail(id, by);
  }

  /** Confirms a proposal, so that the district's officer gets it. */
  @Post(':id/confirm')
  @HttpCode(200)
  @Roles('analyst')
  @ApiOkResponse({ type: ProposalDetail })
  confirm(
    @Param('id', ParseIntPipe) id: number,
    @Body() { note, version }: ConfirmProposal,
    @CurrentUser() by: SignedIn,
  ): Promise<ProposalDetail> {
    return this.proposals.confirm(id, by, note, version);
  }

  /** Declines a proposal. */
  @Post(':id/decline')
  @HttpCode(200)
  @Roles('analyst')
  @ApiOkResponse({ type: ProposalDetail })
  decline(
    @Param('id', ParseIntPipe) id: number,
    @Body() { reason, version }: RefuseProposal,
    @CurrentUser() by: SignedIn,
  ): Promise<ProposalDetail> {
    return this.proposals.decline(id, by, reason, version);
  }

  /** Sends a confirmed proposal back to the analysts. */
  @Post(':id/return')
  @HttpCode(200)
  @Roles('officer')
  @ApiOkResponse({ type: ProposalDetail })
  return(
    @Param('id', ParseIntPipe) id: number,
    @Body() { reason, version }: RefuseProposal,
    @CurrentUser() by: SignedIn,
  ): Promise<ProposalDetail> {
    return this.proposals.return(id, by, reason, version);
  }

  /** Shows the notice exactly as it would go out, and to how many. */
  @Post(':id/preview')
  @HttpCode(200)
  @Roles('analyst', 'officer')
  @ApiOkResponse({ type: NoticePreview })
  preview(
    @Param('id', ParseIntPipe) id: number,
    @Body() { expiresAt }: PreviewProposal,
    @CurrentUser() by: SignedIn,
  ): Promise<NoticePreview> {
    return this.proposals.preview(id, by, expiresAt);
  }

  /** Issues (or ends) what was previewed. */
  @Post(':id/issue')
  @HttpCode(200)
  @Roles('officer')
  @ApiOkResponse({ type: NoticeDetail })
  issue(
    @Param('id', ParseIntPipe) id: number,
    @Body() wanted: IssueProposal,
    @CurrentUser() by: SignedIn,
  ): Promise<NoticeDetail> {
    return this.proposals.issue(id, by, wanted);
  }
}

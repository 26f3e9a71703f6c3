import { Body, Controller, Get, HttpCode, Param, ParseIntPipe, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { OutboxPage } from '../outbox/dto/outbox-row.dto';
import { DeliveryQuery, NoticeByHand, NoticeDraft, NoticeEnding, NoticeQuery } from './dto/notice-input.dto';
import { NoticePreview } from './dto/notice-preview.dto';
import { NoticeDetail, NoticePage } from './dto/notice.dto';
import { NoticeDesk } from './notice-desk';
import { NoticeLogService } from './notice-log.service';

/** The notice log, and what an officer does by hand. */
@ApiTags('notices')
@Controller('notices')
export class NoticesController {
  constructor(
    private readonly log: NoticeLogService,
    private readonly desk: NoticeDesk,
  ) {}

  /** Lists notices, newest first. */
  @Get()
  @ApiOkResponse({ type: NoticePage })
  @Roles('administrator', 'analyst', 'officer')
  page(@Query() query: NoticeQuery): Promise<NoticePage> {
    return this.log.page(query);
  }

  /** Shows a notice exactly as it would go out. */
  @Post('preview')
  @ApiOkResponse({ type: NoticePreview })
  @HttpCode(200)
  @Roles('officer')
  preview(@Body() draft: NoticeDraft, @CurrentUser() by: SignedIn): Promise<NoticePreview> {
    return this.desk.preview(draft, by);
  }

  /** Issues a notice without a proposal, in one's own district. */
  @Post()
  @ApiCreatedResponse({ type: NoticeDetail })
  @Roles('officer')
  issue(@Body() notice: NoticeByHand, @CurrentUser() by: SignedIn): Promise<NoticeDetail> {
    return this.desk.issue(notice, by);
  }

  /** Shows one notice with its texts, events and delivery. */
  @Get(':id')
  @ApiOkResponse({ type: NoticeDetail })
  @Roles('administrator', 'analyst', 'officer')
  detail(@Param('id', ParseIntPipe) id: number): Promise<NoticeDetail> {
    return this.log.detail(id);
  }

  /** Lists a notice's messages with masked addresses. */
  @Get(':id/deliveries')
  @ApiOkResponse({ type: OutboxPage })
  @Roles('administrator', 'analyst', 'officer')
  deliveries(
    @Param('id', ParseIntPipe) id: number,
    @Query() query: DeliveryQuery,
    @CurrentUser() by: SignedIn,
  ): Promise<OutboxPage> {
    return this.log.deliveries(id, query, by);
  }

  /** Shows the message that would tell subscribers of the end. */
  @Post(':id/end-preview')
  @ApiOkResponse({ type: NoticePreview })
  @HttpCode(200)
  @Roles('officer')
  previewEnd(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<NoticePreview> {
    return this.desk.previewEnd(id, by);
  }

  /** Ends a notice before its written end. */
  @Post(':id/end')
  @ApiOkResponse({ type: NoticeDetail })
  @HttpCode(200)
  @Roles('officer')
  end(
    @Param('id', ParseIntPipe) id: number,
    @Body() ending: NoticeEnding,
    @CurrentUser() by: SignedIn,
  ): Promise<NoticeDetail> {
    return this.desk.end(id, ending, by);
  }
}

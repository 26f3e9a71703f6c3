import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../decorators';
import type { SignedIn } from '../signed-in';
import { ActivityLogService } from '../../activity/activity-log.service';
import { ActivityPage, ActivityQuery } from '../../activity/dto/activity-entry.dto';

/** The record of what was done. */
@ApiTags('activity')
@Controller('activity')
export class ActivityController {
  constructor(private readonly log: ActivityLogService) {}

  @Get()
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: ActivityPage })
  page(@CurrentUser() user: SignedIn, @Query() query: ActivityQuery): Promise<ActivityPage> {
    return this.log.page(user, query);
  }
}

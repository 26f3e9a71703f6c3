import { Controller, Get, Param, ParseIntPipe, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { DeskService } from './desk.service';
import { Desk } from './dto/desk.dto';
import { DistrictHistory, HistoryQuery } from './dto/history.dto';
import { HistoryService } from './history.service';

/** What people look at first: the air now, and how it came to be so. */
@ApiTags('desk')
@Controller()
export class DeskController {
  constructor(
    private readonly desk: DeskService,
    private readonly history: HistoryService,
  ) {}

  /** Shows all districts' air, the proposals that wait, and which towers are late. */
  @Get('desk')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: Desk })
  now(@CurrentUser() user: SignedIn): Promise<Desk> {
    return this.desk.at(user);
  }

  /** Shows a district's inversion strength over a span. */
  @Get('districts/:id/history')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: DistrictHistory })
  past(
    @Param('id', ParseIntPipe) districtId: number,
    @Query() query: HistoryQuery,
  ): Promise<DistrictHistory> {
    return this.history.of(districtId, query);
  }
}

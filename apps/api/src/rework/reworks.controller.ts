import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Roles } from '../auth/decorators';
import { ReworkDto, ReworksQuery } from './dto/rework.dto';
import { ReworksService } from './reworks.service';

/** What was worked out anew after a change, and what it altered. */
@ApiTags('readings')
@Controller('reworks')
export class ReworksController {
  constructor(private readonly reworks: ReworksService) {}

  /** Lists the newest fifty, with progress while they are under way. */
  @Get()
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [ReworkDto] })
  list(@Query() { towerId }: ReworksQuery): Promise<ReworkDto[]> {
    return this.reworks.list(towerId);
  }
}

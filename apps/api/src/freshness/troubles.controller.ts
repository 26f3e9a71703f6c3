import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Roles } from '../auth/decorators';
import { TroubleDto, TroublesQuery } from './dto/trouble.dto';
import { TroublesService } from './troubles.service';

/** What is wrong with the towers' data. */
@ApiTags('readings')
@Controller('troubles')
export class TroublesController {
  constructor(private readonly troubles: TroublesService) {}

  /** Lists the open troubles, then the newest that are over. */
  @Get()
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [TroubleDto] })
  list(@Query() { open }: TroublesQuery): Promise<TroubleDto[]> {
    return this.troubles.list(open);
  }
}

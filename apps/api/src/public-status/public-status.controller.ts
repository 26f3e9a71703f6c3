import { Controller, Get, Header, Param } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Public } from '../auth/decorators';
import { PublicStatusDto } from './dto/public-status.dto';
import { PublicStatusService } from './public-status.service';

/** What holds, for everybody. */
@Public()
@ApiTags('public')
@Controller('public')
export class PublicStatusController {
  constructor(private readonly status: PublicStatusService) {}

  /** Tells what holds in every district. */
  @Get('status')
  @Header('Cache-Control', 'public, no-cache')
  @ApiOkResponse({ type: [PublicStatusDto] })
  list(): Promise<PublicStatusDto[]> {
    return this.status.list();
  }

  /** Tells what holds in one district. */
  @Get('districts/:slug')
  @Header('Cache-Control', 'public, no-cache')
  @ApiOkResponse({ type: PublicStatusDto })
  get(@Param('slug') slug: string): Promise<PublicStatusDto> {
    return this.status.get(slug);
  }
}

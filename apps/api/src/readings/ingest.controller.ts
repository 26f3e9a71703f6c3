import { Body, Controller, Headers, HttpCode, Post, UseGuards } from '@nestjs/common';
import { ApiBearerAuth, ApiConsumes, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Public } from '../auth/decorators';
import { IngestResult } from './dto/ingest-result.dto';
import { PushService } from './push.service';
import { SiteKeyGuard, SiteTower } from './site-key.guard';

/** Where sites push their readings. */
@ApiTags('ingest')
@ApiBearerAuth()
@Controller('ingest')
export class IngestController {
  constructor(private readonly pushed: PushService) {}

  /**
   * Takes readings of the key's own tower: JSON `{"readings": [{time, sensor, value}]}`, one such object a line
   * (NDJSON), or CSV laid out as the tower's push source says; gzip too. Sending the same again changes nothing.
   */
  @Post('readings')
  @HttpCode(200)
  @Public()
  @UseGuards(SiteKeyGuard)
  @ApiConsumes('application/json', 'application/x-ndjson', 'text/csv')
  @ApiOkResponse({ type: IngestResult })
  readings(
    @SiteTower() towerId: number,
    @Headers('content-type') contentType: string | undefined,
    @Body() body: unknown,
  ): Promise<IngestResult> {
    return this.pushed.push(towerId, contentType ?? '', body);
  }
}

import { Body, Controller, Headers, HttpCode, Post, UseGuards, UseInterceptors } from '@nestjs/common';
import {
  ApiBearerAuth,
  ApiConsumes,
  ApiOkResponse,
  ApiTags,
  ApiTooManyRequestsResponse,
} from '@nestjs/swagger';
import { Public } from '../auth/decorators';
import type { Site } from '../towers/keys.service';
import { IngestResult } from './dto/ingest-result.dto';
import { PushService } from './push.service';
import { SiteBody } from './site-body.interceptor';
import { SentBy, SiteKeyGuard } from './site-key.guard';

/** Where sites push their readings. */
@ApiTags('ingest')
@ApiBearerAuth()
@Controller('ingest')
export class IngestController {
  constructor(private readonly pushed: PushService) {}

  /**
   * Takes readings of the key's own tower: JSON `{"readings": [{time, sensor, value}]}`, one such object a line
   * (NDJSON), or CSV laid out as the tower's push source says; gzip too, 10 MB unpacked at most. Bad rows are refused one
   * by one, the rest is taken. Sending the same again changes nothing.
   */
  @Post('readings')
  @HttpCode(200)
  @Public()
  @UseGuards(SiteKeyGuard)
  @UseInterceptors(SiteBody)
  @ApiConsumes('application/json', 'application/x-ndjson', 'text/csv')
  @ApiOkResponse({ type: IngestResult })
  @ApiTooManyRequestsResponse({
    description: 'The key has sent too much; Retry-After says when to send again',
  })
  readings(
    @SentBy() site: Site,
    @Headers('content-type') contentType: string | undefined,
    @Body() body: unknown,
  ): Promise<IngestResult> {
    return this.pushed.push(site, contentType ?? '', body);
  }
}

import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Roles } from '../auth/decorators';
import { SubscriberCountsService } from './counts.service';
import { SubscriberCount } from './dto/subscriber-count.dto';

/** Subscribers, for staff: counts only. */
@ApiTags('subscribers')
@Controller('subscribers')
export class SubscribersController {
  constructor(private readonly counts: SubscriberCountsService) {}

  /** Counts subscribers for each district and kind of notice. */
  @Get('counts')
  @ApiOkResponse({ type: [SubscriberCount] })
  @Roles('administrator', 'analyst', 'officer')
  list(): Promise<SubscriberCount[]> {
    return this.counts.list();
  }
}

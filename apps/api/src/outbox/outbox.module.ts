import { Module } from '@nestjs/common';
import { OutboxDispatcher } from './outbox-dispatcher';
import { OutboxQueue } from './outbox-queue';
import { OutboxService } from './outbox.service';

/** Messages on their way to people, by topic; it knows no feature. */
@Module({
  providers: [OutboxDispatcher, OutboxQueue, OutboxService],
  exports: [OutboxDispatcher, OutboxService],
})
export class OutboxModule {}

import { Module } from '@nestjs/common';
import { OutboxModule } from '../outbox/outbox.module';
import { StaffContacts } from './staff-contacts';
import { TroubleFinder } from './trouble-finder';
import { TroubleTeller } from './trouble-teller';
import { TroublesController } from './troubles.controller';
import { TroublesService } from './troubles.service';

/** Late, silent and wrong-clocked towers: seen, kept, told to the analysts. */
@Module({
  imports: [OutboxModule],
  controllers: [TroublesController],
  providers: [StaffContacts, TroubleFinder, TroubleTeller, TroublesService],
  exports: [TroublesService],
})
export class FreshnessModule {}

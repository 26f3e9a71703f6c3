import { Module } from '@nestjs/common';
import { DistrictsModule } from '../districts/districts.module';
import { OfficeModule } from '../office/office.module';
import { OutboxModule } from '../outbox/outbox.module';
import { ContactsService } from './contacts.service';
import { SubscriberCountsService } from './counts.service';
import { ListImportService } from './list-import.service';
import { ManageLinks } from './manage-links';
import { RequestLimit } from './request-limit';
import { SubscribersController } from './subscribers.controller';
import { SubscribersService } from './subscribers.service';
import { SubscriptionMessages } from './subscription-messages';
import { SubscriptionsController } from './subscriptions.controller';
import { WishesService } from './wishes.service';

/** Residents who want to be told. */
@Module({
  imports: [DistrictsModule, OfficeModule, OutboxModule],
  controllers: [SubscribersController, SubscriptionsController],
  providers: [
    ContactsService,
    ListImportService,
    ManageLinks,
    RequestLimit,
    SubscriberCountsService,
    SubscribersService,
    SubscriptionMessages,
    WishesService,
  ],
  exports: [ContactsService, ListImportService, ManageLinks, SubscriberCountsService, WishesService],
})
export class SubscribersModule {}

import { Module } from '@nestjs/common';
import { OfficeModule } from '../office/office.module';
import { OutboxModule } from '../outbox/outbox.module';
import { SubscribersModule } from '../subscribers/subscribers.module';
import { IncomingTextsService } from './incoming-texts.service';
import { MailChannel } from './mail-channel';
import { MailWriter } from './mail-writer';
import { SmsChannel } from './sms-channel';
import { SmsHooksController } from './sms-hooks.controller';
import { SmsReceiptsService } from './sms-receipts.service';

/** The ways out: mail by SMTP, text messages by the provider, and what comes back. */
@Module({
  imports: [OfficeModule, OutboxModule, SubscribersModule],
  controllers: [SmsHooksController],
  providers: [IncomingTextsService, MailChannel, MailWriter, SmsChannel, SmsReceiptsService],
})
export class DeliveryModule {}

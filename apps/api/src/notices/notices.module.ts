import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuthModule } from '../auth/auth.module';
import { DistrictsModule } from '../districts/districts.module';
import { OfficeModule } from '../office/office.module';
import { OutboxModule } from '../outbox/outbox.module';
import { RulesModule } from '../rules/rules.module';
import { Notice } from './models/notice.model';
import { NoticeComposer } from './notice-composer';
import { NoticeDesk } from './notice-desk';
import { NoticeEvents } from './notice-events';
import { NoticeExpiry } from './notice-expiry';
import { NoticeLogService } from './notice-log.service';
import { NoticeRecipients } from './notice-recipients';
import { NoticesController } from './notices.controller';
import { NoticesService } from './notices.service';

/** Notices: their words, their life, their log. */
@Module({
  imports: [
    SequelizeModule.forFeature([Notice]),
    AuthModule,
    DistrictsModule,
    OfficeModule,
    OutboxModule,
    RulesModule,
  ],
  controllers: [NoticesController],
  providers: [
    NoticeComposer,
    NoticeDesk,
    NoticeEvents,
    NoticeExpiry,
    NoticeLogService,
    NoticeRecipients,
    NoticesService,
  ],
  exports: [NoticeExpiry, NoticeLogService, NoticesService],
})
export class NoticesModule {}

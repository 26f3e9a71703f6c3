import { Module } from '@nestjs/common';
import { EventEmitterModule } from '@nestjs/event-emitter';
import { ActivityModule } from './activity/activity.module';
import { AuthModule } from './auth/auth.module';
import { CommonModule } from './common/common.module';
import { ComputeModule } from './compute/compute.module';
import { ConfigModule } from './config/config.module';
import { DatabaseModule } from './database/database.module';
import { DeliveryModule } from './delivery/delivery.module';
import { DemoModule } from './demo/demo.module';
import { DeskModule } from './desk/desk.module';
import { DistrictsModule } from './districts/districts.module';
import { FreshnessModule } from './freshness/freshness.module';
import { ForecastsModule } from './forecasts/forecasts.module';
import { HealthModule } from './health/health.module';
import { LoggingModule } from './http/logging.module';
import { WebFilesModule } from './http/web-files.module';
import { NoticesModule } from './notices/notices.module';
import { OfficeModule } from './office/office.module';
import { OutboxModule } from './outbox/outbox.module';
import { ProfilesModule } from './profiles/profiles.module';
import { ProposalsModule } from './proposals/proposals.module';
import { PublicStatusModule } from './public-status/public-status.module';
import { ReadingsModule } from './readings/readings.module';
import { UploadsModule } from './readings/uploads/uploads.module';
import { ReworkModule } from './rework/rework.module';
import { RulesModule } from './rules/rules.module';
import { SchedulerModule } from './scheduler/scheduler.module';
import { ScreeningModule } from './screening/screening.module';
import { SubscribersModule } from './subscribers/subscribers.module';
import { TowersModule } from './towers/towers.module';
import { UsersModule } from './users/users.module';

/** The whole service: the ground floor first, then the rooms in the order in which they may use each other. */
@Module({
  imports: [
    ConfigModule,
    LoggingModule,
    CommonModule,
    ComputeModule,
    DatabaseModule,
    EventEmitterModule.forRoot(),
    SchedulerModule,
    ActivityModule,
    UsersModule,
    AuthModule,
    ReworkModule,
    TowersModule,
    DistrictsModule,
    ReadingsModule,
    UploadsModule,
    ScreeningModule,
    ProfilesModule,
    ForecastsModule,
    RulesModule,
    OfficeModule,
    OutboxModule,
    SubscribersModule,
    FreshnessModule,
    NoticesModule,
    ProposalsModule,
    DeskModule,
    DeliveryModule,
    DemoModule,
    PublicStatusModule,
    HealthModule,
    WebFilesModule,
  ],
})
export class AppModule {}

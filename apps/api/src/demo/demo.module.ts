import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { DistrictsModule } from '../districts/districts.module';
import { ForecastsModule } from '../forecasts/forecasts.module';
import { NoticesModule } from '../notices/notices.module';
import { OfficeModule } from '../office/office.module';
import { OutboxModule } from '../outbox/outbox.module';
import { ProfilesModule } from '../profiles/profiles.module';
import { ProposalsModule } from '../proposals/proposals.module';
import { ReadingsModule } from '../readings/readings.module';
import { RulesModule } from '../rules/rules.module';
import { SubscribersModule } from '../subscribers/subscribers.module';
import { TowersModule } from '../towers/towers.module';
import { DemoDecisions } from './demo-decisions';
import { DemoDelivery } from './demo-delivery';
import { DemoForecasts } from './demo-forecasts';
import { DemoHistory } from './demo-history';
import { DemoOffice } from './demo-office';

/** The invented demo, fed in through the services of every other room. */
@Module({
  imports: [
    AuthModule,
    DistrictsModule,
    ForecastsModule,
    NoticesModule,
    OfficeModule,
    OutboxModule,
    ProfilesModule,
    ProposalsModule,
    ReadingsModule,
    RulesModule,
    SubscribersModule,
    TowersModule,
  ],
  providers: [DemoDecisions, DemoDelivery, DemoForecasts, DemoHistory, DemoOffice],
})
export class DemoModule {}

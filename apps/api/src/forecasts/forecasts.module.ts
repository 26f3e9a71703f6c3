import { Module } from '@nestjs/common';
import { DistrictsModule } from '../districts/districts.module';
import { SchedulerModule } from '../scheduler/scheduler.module';
import { TowersModule } from '../towers/towers.module';
import { ForecastRows } from './forecast-rows';
import { ForecastsController } from './forecasts.controller';
import { ForecastsService } from './forecasts.service';
import { KnownForecasts } from './known-forecasts';
import { OutcomesService } from './outcomes.service';

/** Days' forecasts: entered or read from tables, given to the rules, and held beside what came. */
@Module({
  imports: [DistrictsModule, TowersModule, SchedulerModule],
  controllers: [ForecastsController],
  providers: [ForecastRows, ForecastsService, KnownForecasts, OutcomesService],
  exports: [ForecastsService, KnownForecasts, OutcomesService],
})
export class ForecastsModule {}

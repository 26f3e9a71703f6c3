import { Module } from '@nestjs/common';
import { DistrictsModule } from '../districts/districts.module';
import { TowersModule } from '../towers/towers.module';
import { CalendarService } from './calendar.service';
import { FlagsService } from './flags.service';
import { LimitsController } from './limits.controller';
import { LimitsService } from './limits.service';
import { OverridesController } from './overrides.controller';
import { OverridesService } from './overrides.service';
import { RawService } from './raw.service';
import { ReadingDetailService } from './reading-detail.service';
import { ReadingWindows } from './reading-windows';
import { ScreeningController } from './screening.controller';
import { ScreeningStage } from './screening.stage';
import { ScreeningStore } from './screening-store';
import { TowerZones } from './tower-zones';

/** Screening of readings, what people set about them, and their block means. */
@Module({
  imports: [DistrictsModule, TowersModule],
  controllers: [OverridesController, ScreeningController, LimitsController],
  providers: [
    ReadingWindows,
    ScreeningStore,
    ScreeningStage,
    OverridesService,
    CalendarService,
    FlagsService,
    RawService,
    ReadingDetailService,
    LimitsService,
    TowerZones,
  ],
  exports: [ScreeningStore],
})
export class ScreeningModule {}

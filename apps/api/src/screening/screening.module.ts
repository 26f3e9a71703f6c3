import { Module } from '@nestjs/common';
import { TowersModule } from '../towers/towers.module';
import { OverridesController } from './overrides.controller';
import { OverridesService } from './overrides.service';
import { ReadingWindows } from './reading-windows';
import { ScreeningStage } from './screening.stage';
import { ScreeningStore } from './screening-store';

/** Screening of readings, what people set about them, and their block means. */
@Module({
  imports: [TowersModule],
  controllers: [OverridesController],
  providers: [ReadingWindows, ScreeningStore, ScreeningStage, OverridesService],
})
export class ScreeningModule {}

import { Module } from '@nestjs/common';
import { TowersModule } from '../towers/towers.module';
import { ReadingWindows } from './reading-windows';
import { ScreeningStage } from './screening.stage';
import { ScreeningStore } from './screening-store';

/** Screening of readings, and their block means. */
@Module({
  imports: [TowersModule],
  providers: [ReadingWindows, ScreeningStore, ScreeningStage],
})
export class ScreeningModule {}

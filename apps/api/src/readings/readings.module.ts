import { Module } from '@nestjs/common';
import { ProfilesModule } from '../profiles/profiles.module';
import { SchedulerModule } from '../scheduler/scheduler.module';
import { ScreeningModule } from '../screening/screening.module';
import { TowersModule } from '../towers/towers.module';
import { CollectController } from './collector/collect.controller';
import { FileTaker } from './collector/file-taker';
import { FolderSources } from './collector/folder-sources';
import { ReadingsCollector } from './collector/readings-collector';
import { FreshWriter } from './importing/fresh/fresh-writer';
import { ImportRunner } from './importing/import-runner';
import { ImportStore } from './importing/import-store';
import { ReadingTaker } from './importing/reading-taker';
import { FetchLimits } from './fetching/fetch-limits';
import { HttpSources } from './fetching/http-sources';
import { ImportsController } from './imports.controller';
import { ImportsService } from './imports.service';
import { IngestController } from './ingest.controller';
import { PushLimits } from './push-limits';
import { PushService } from './push.service';
import { ReadingContexts } from './reading-contexts';
import { ReadingsService } from './readings.service';
import { ReadingsStore } from './readings-store';
import { RefusedTable } from './refused-table';
import { WithdrawalsService } from './withdrawals.service';

/** Every way in for readings. */
@Module({
  imports: [ProfilesModule, ScreeningModule, TowersModule, SchedulerModule],
  controllers: [CollectController, IngestController, ImportsController],
  providers: [
    ReadingsStore,
    ImportStore,
    ReadingTaker,
    FreshWriter,
    ImportRunner,
    ReadingsService,
    ReadingContexts,
    PushLimits,
    PushService,
    ImportsService,
    RefusedTable,
    WithdrawalsService,
    FetchLimits,
    FileTaker,
    FolderSources,
    HttpSources,
    ReadingsCollector,
  ],
  exports: [ImportRunner, ReadingContexts, ReadingsService, ReadingsCollector],
})
export class ReadingsModule {}

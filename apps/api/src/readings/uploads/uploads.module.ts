import { Module } from '@nestjs/common';
import { SchedulerModule } from '../../scheduler/scheduler.module';
import { TowersModule } from '../../towers/towers.module';
import { ReadingsModule } from '../readings.module';
import { KeptComparison } from './kept-comparison';
import { MappingChecks } from './mapping-checks';
import { PreviewsService } from './previews.service';
import { ProposalsService } from './proposals.service';
import { UploadFiles } from './upload-files';
import { UploadRows } from './upload-rows';
import { UploadRuns } from './upload-runs.service';
import { UploadTexts } from './upload-texts';
import { UploadsController } from './uploads.controller';
import { UploadsService } from './uploads.service';
import { WorkbookTexts } from './workbook-texts';

/** Files of readings that staff send. */
@Module({
  imports: [ReadingsModule, TowersModule, SchedulerModule],
  controllers: [UploadsController],
  providers: [
    UploadFiles,
    UploadRows,
    UploadTexts,
    WorkbookTexts,
    MappingChecks,
    KeptComparison,
    ProposalsService,
    PreviewsService,
    UploadRuns,
    UploadsService,
  ],
  exports: [UploadRuns],
})
export class UploadsModule {}

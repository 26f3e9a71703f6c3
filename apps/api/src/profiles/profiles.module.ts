import { Module } from '@nestjs/common';
import { SchedulerModule } from '../scheduler/scheduler.module';
import { TowersModule } from '../towers/towers.module';
import { Hours } from './hours';
import { PipelineService } from './pipeline.service';
import { ProfileStore } from './profile-store';
import { ProfilesController } from './profiles.controller';
import { ProfilesService } from './profiles.service';
import { ProfilesStage } from './profiles.stage';

/** Profiles and all that follows from them, and the way there. */
@Module({
  imports: [TowersModule, SchedulerModule],
  controllers: [ProfilesController],
  providers: [ProfileStore, Hours, ProfilesStage, ProfilesService, PipelineService],
  exports: [Hours, PipelineService, ProfileStore, ProfilesService],
})
export class ProfilesModule {}

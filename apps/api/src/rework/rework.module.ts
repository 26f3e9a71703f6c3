import { Global, Module } from '@nestjs/common';
import { ChangedProfilesReader } from './changed-profiles';
import { Pending } from './pending';
import { ReworkService } from './rework.service';
import { ReworkWatch } from './rework-watch';
import { ReworksController } from './reworks.controller';
import { ReworksService } from './reworks.service';
import { RuleTruths } from './rule-truths';

/** What follows from a change of readings, sensors or settings, for every room that makes one. */
@Global()
@Module({
  controllers: [ReworksController],
  providers: [ReworkService, ReworkWatch, ReworksService, Pending, ChangedProfilesReader, RuleTruths],
  exports: [ReworkService, ReworkWatch],
})
export class ReworkModule {}

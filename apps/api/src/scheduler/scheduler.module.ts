import { Global, Module } from '@nestjs/common';
import { ScheduleModule } from '@nestjs/schedule';
import { JobRows } from './job-rows';
import { JobsService } from './jobs.service';

/** Jobs that run every so often, for everybody. */
@Global()
@Module({
  imports: [ScheduleModule.forRoot()],
  providers: [JobRows, JobsService],
  exports: [JobRows, JobsService],
})
export class SchedulerModule {}

import { Global, Module } from '@nestjs/common';
import { ActivityLogService } from './activity-log.service';
import { ActivityService } from './activity.service';

/** The record of what was done, for everybody. */
@Global()
@Module({ providers: [ActivityLogService, ActivityService], exports: [ActivityLogService, ActivityService] })
export class ActivityModule {}

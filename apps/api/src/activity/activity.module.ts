import { Global, Module } from '@nestjs/common';
import { ActivityService } from './activity.service';

/** The record of what was done, for everybody. */
@Global()
@Module({ providers: [ActivityService], exports: [ActivityService] })
export class ActivityModule {}

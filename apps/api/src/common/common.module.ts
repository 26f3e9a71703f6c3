import { Global, Module } from '@nestjs/common';
import { Clock, SystemClock } from './clock';

/** The clock, for everybody. */
@Global()
@Module({ providers: [{ provide: Clock, useClass: SystemClock }], exports: [Clock] })
export class CommonModule {}

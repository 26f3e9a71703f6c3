import { Global, Module } from '@nestjs/common';
import { Clock, SystemClock } from './clock';

let clock: Clock = new SystemClock();

/** Puts another clock in the place of the computer's for applications made from now on: the demo's history runs under it. */
export function runUnder(given: Clock): void {
  clock = given;
}

/** The clock, for everybody. */
@Global()
@Module({ providers: [{ provide: Clock, useFactory: () => clock }], exports: [Clock] })
export class CommonModule {}

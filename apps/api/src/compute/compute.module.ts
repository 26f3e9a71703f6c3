import { Global, Module } from '@nestjs/common';
import { ComputePool } from './compute-pool';

/** Heavy computing, for every room. */
@Global()
@Module({ providers: [ComputePool], exports: [ComputePool] })
export class ComputeModule {}

import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { DirtyStages } from '../database/dirty';
import { JobsService } from '../scheduler/jobs.service';

const SWEEP_EVERY_S = 30;

/** The steps from readings to district findings, as a whole. */
@Injectable()
export class PipelineService implements OnModuleInit {
  constructor(
    private readonly dirty: DirtyStages,
    private readonly jobs: JobsService,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.jobs.register('work out what waits', SWEEP_EVERY_S, () => this.drainAll());
  }

  /** Works out everything that waits: readings, screening, profiles, districts. */
  drainAll(): Promise<void> {
    return this.dirty.drainAll();
  }

  /** Works out nothing from now on but when `drainAll` is called. */
  waitToBeAsked(): void {
    this.dirty.waitToBeAsked();
  }

  /** How many blocks of a tower ended and wait. */
  async state(towerId: number): Promise<{ pending: number }> {
    return { pending: await this.dirty.pending(towerId, this.clock.now()) };
  }
}

import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { DirtyStages } from '../../database/dirty';
import { UnitOfWork } from '../../database/unit-of-work';
import { LiveEvaluation } from '../evaluation/live-evaluation';
import { DistrictBatches } from './district-batches';
import { DistrictPlans } from './district-plan';
import { DistrictRows } from './district-rows';

/** Marks read at a time, and how far back of the newest they may lie, s. */
const BATCH = 2_000;
const BATCH_SPAN_S = 4 * 86_400;

/**
 * Stage 3: works out the district blocks that changed profiles touch, newest first, and evaluates the rules in force
 * in the same transaction, so that no finding is without its evaluation.
 */
@Injectable()
export class DistrictStage implements OnModuleInit {
  constructor(
    private readonly dirty: DirtyStages,
    private readonly plans: DistrictPlans,
    private readonly batches: DistrictBatches,
    private readonly rows: DistrictRows,
    private readonly evaluation: LiveEvaluation,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.dirty.registerStage(3, () => this.batch());
  }

  private async batch(): Promise<number> {
    const now = this.clock.now();
    const newest = await this.dirty.newest(3, BATCH, now);
    const marks = newest.filter(({ t }) => t > newest[0]!.t - BATCH_SPAN_S);
    if (marks.length === 0) return 0;
    const plans = await this.plans.all();
    const known = marks.filter(({ subject }) => plans.has(subject));
    const strangers = marks.filter(({ subject }) => !plans.has(subject));
    const batch = await this.batches.of(plans, known, now);
    const settled = [...strangers, ...batch.settled];
    if (settled.length === 0) return 0;
    await this.work.run(async () => {
      await this.rows.write(batch.blocks);
      await this.evaluation.evaluate(batch.blocks);
      await this.dirty.settle(3, settled);
    }, 'bulk');
    return settled.length;
  }
}

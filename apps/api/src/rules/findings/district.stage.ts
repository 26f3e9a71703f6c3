import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { groupBy } from '../../common/group-by';
import { DirtyStages, type DirtyRow } from '../../database/dirty';
import { UnitOfWork } from '../../database/unit-of-work';
import { LiveEvaluation } from '../evaluation/live-evaluation';
import { DistrictBatches } from './district-batches';
import type { DistrictBlock } from './district-block';
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
    const settled: DirtyRow[] = marks.filter(({ subject }) => !plans.has(subject));
    const made: DistrictBlock[] = [];
    for (const [districtId, own] of groupBy(marks, ({ subject }) => subject)) {
      const plan = plans.get(districtId);
      if (!plan) continue;
      const batch = await this.batches.of(plan, own, now);
      settled.push(...batch.settled);
      made.push(...batch.blocks);
    }
    if (settled.length === 0) return 0;
    await this.work.run(async () => {
      await this.rows.write(made);
      await this.evaluation.evaluate(made);
      await this.dirty.settle(3, settled);
    }, 'bulk');
    return settled.length;
  }
}

import { Injectable, Logger } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Transaction, type Sequelize } from 'sequelize';
import type { Lane } from './gate';
import { inUnit, openUnit, type Unit } from './unit-context';

/** Transactions: everything that is written inside one `run` is kept together or not at all. */
@Injectable()
export class UnitOfWork {
  private readonly logger = new Logger(UnitOfWork.name);

  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /**
   * Runs work in one transaction (BEGIN IMMEDIATE behind the gate) and commits; an error rolls back and is thrown on.
   * Inside another `run` it joins that one, so that an error undoes the whole. Work that was not awaited and goes on
   * after the commit writes on its own account. Keep it short: nobody else writes meanwhile.
   */
  async run<T>(work: () => Promise<T>, lane: Lane = 'people'): Promise<T> {
    if (openUnit()) return work();
    const unit: Unit = { lane, state: 'waiting', afterCommit: [] };
    const result = await inUnit(unit, () => this.transact(unit, work));
    for (const wanted of unit.afterCommit) this.callSafely(wanted);
    return result;
  }

  /** Calls back once the running transaction is committed (never when it is rolled back); at once outside of one. */
  afterCommit(wanted: () => void): void {
    const unit = openUnit();
    if (unit) unit.afterCommit.push(wanted);
    else this.callSafely(wanted);
  }

  private async transact<T>(unit: Unit, work: () => Promise<T>): Promise<T> {
    const transaction = await this.sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE });
    unit.transaction = transaction;
    unit.state = 'open';
    try {
      const result = await work();
      unit.state = 'committed';
      await transaction.commit();
      return result;
    } catch (error) {
      const committing = unit.state !== 'open';
      unit.state = 'rolled back';
      if (!committing) await transaction.rollback().catch((fault: unknown) => this.logger.error(fault));
      throw error;
    }
  }

  /** What was committed stays committed, so a listener's error is logged, not thrown. */
  private callSafely(wanted: () => void): void {
    try {
      wanted();
    } catch (error) {
      this.logger.error(error);
    }
  }
}

import { AsyncLocalStorage } from 'node:async_hooks';
import type { Transaction } from 'sequelize';
import type { Lane } from './gate';

/** One unit of work as its asynchronous context carries it. */
export interface Unit {
  lane: Lane;
  /** `open` from BEGIN until COMMIT or ROLLBACK is asked for. */
  state: 'waiting' | 'open' | 'committed' | 'rolled back';
  transaction?: Transaction;
  afterCommit: (() => void)[];
}

const units = new AsyncLocalStorage<Unit>();

/** Runs something in a unit's context. */
export function inUnit<T>(unit: Unit, work: () => Promise<T>): Promise<T> {
  return units.run(unit, work);
}

/** The unit whose context this is, whatever its state. */
export function unitHere(): Unit | undefined {
  return units.getStore();
}

/** The unit that is open here; undefined outside, and for work that outlived its unit. */
export function openUnit(): Unit | undefined {
  const unit = units.getStore();
  return unit?.state === 'open' ? unit : undefined;
}

/**
 * What sequelize asks for the transaction of the running context, so that a statement without `{ transaction }` joins
 * it. Sequelize's own managed transactions are not used, so `run` and `set` have nothing to keep.
 */
export const transactionNamespace = {
  bind: <F>(work: F): F => work,
  run: (work: (context: unknown) => unknown): unknown => work(undefined),
  get: (key: string): unknown => (key === 'transaction' ? openUnit()?.transaction : undefined),
  set: (): void => undefined,
};

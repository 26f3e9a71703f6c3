import type { Sequelize } from 'sequelize';
import { UnitOfWork } from './unit-of-work';

/**
 * Lets every transaction that is under way or waits finish, then closes the store. Sequelize alone would roll back
 * the one under way.
 */
export async function closeStore(sequelize: Sequelize): Promise<void> {
  await new UnitOfWork(sequelize).run(() => Promise.resolve(), 'bulk');
  await sequelize.close();
}

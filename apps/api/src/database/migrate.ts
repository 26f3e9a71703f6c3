import { Logger } from '@nestjs/common';
import type { Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { StartFault } from '../common/start-fault';
import { migrations, type Migration } from './migrations';
import { UnitOfWork } from './unit-of-work';

/**
 * Brings the schema up to date, each migration in one transaction. Throws a StartFault when the database was made by
 * a newer version than this one.
 */
export async function migrate(sequelize: Sequelize, steps: readonly Migration[] = migrations): Promise<void> {
  const units = new UnitOfWork(sequelize);
  const storage = new SequelizeStorage({ sequelize, modelName: 'migration', tableName: 'migration' });
  const umzug = new Umzug({
    migrations: steps.map(({ name, up }) => ({ name, up: () => units.run(() => runAll(sequelize, up)) })),
    storage,
    logger: undefined,
  });
  const known = new Set(steps.map(({ name }) => name));
  const unknown = (await storage.executed()).find((name) => !known.has(name));
  if (unknown)
    throw new StartFault(
      `The database has "${unknown}", which this version does not know: start the newer version, or restore a backup.`,
    );
  const done = await umzug.up();
  if (done.length > 0) new Logger('Migrations').log(`Migrated: ${done.map(({ name }) => name).join(', ')}`);
}

async function runAll(sequelize: Sequelize, statements: readonly string[]): Promise<void> {
  for (const statement of statements) await sequelize.query(statement);
}

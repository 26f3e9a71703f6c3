import type { SequelizeModuleOptions } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize';
import { migrate } from './migrate';
import { storeOptions } from './store-options';

/** Migrates the store and returns how Nest's module opens it: models by `forFeature`, never a schema of their own. */
export async function openStore(dataDir: string): Promise<SequelizeModuleOptions> {
  const migrating = new Sequelize(storeOptions(dataDir));
  try {
    await migrate(migrating);
  } finally {
    await migrating.close();
  }
  return {
    ...storeOptions(dataDir),
    autoLoadModels: true,
    synchronize: false,
    retryAttempts: 0,
    autoCloseConnection: false,
  } as SequelizeModuleOptions;
}

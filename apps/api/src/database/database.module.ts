import { Global, Inject, Module, type OnApplicationShutdown } from '@nestjs/common';
import { InjectConnection, SequelizeModule } from '@nestjs/sequelize';
import type { Sequelize } from 'sequelize';
import { Settings } from '../config/settings';
import { DirtyStages } from './dirty';
import { closeStore } from './close-store';
import { openStore } from './open-store';
import { lockDataDir } from './process-lock';
import { Sql } from './sql';
import { UnitOfWork } from './unit-of-work';

const lock = 'DATA_DIR_LOCK';

/** Takes the data folder before anything in it is touched. */
@Global()
@Module({
  providers: [
    { provide: lock, inject: [Settings], useFactory: (settings: Settings) => lockDataDir(settings.dataDir) },
  ],
  exports: [lock],
})
class ProcessLockModule {}

/** The store: the data folder's lock, the migrated schema, transactions and plain SQL, for everybody. */
@Global()
@Module({
  imports: [
    ProcessLockModule,
    SequelizeModule.forRootAsync({
      inject: [Settings, lock],
      useFactory: (settings: Settings) => openStore(settings.dataDir),
    }),
  ],
  providers: [DirtyStages, Sql, UnitOfWork],
  exports: [DirtyStages, Sql, UnitOfWork],
})
export class DatabaseModule implements OnApplicationShutdown {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    @Inject(lock) private readonly unlock: () => Promise<void>,
  ) {}

  /** Lets the writes under way finish, closes the store and gives the data folder back. */
  async onApplicationShutdown(): Promise<void> {
    await closeStore(this.sequelize);
    await this.unlock();
  }
}

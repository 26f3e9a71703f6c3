import { Logger } from '@nestjs/common';
import { Sequelize } from 'sequelize';
import { storeFile, storeOptions } from '../database/store-options';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { temporaryFolder } from './temporary-folder';

/** The store alone, without the service: a database of its own with the statements given. */
export interface TestStore {
  sequelize: Sequelize;
  sql: Sql;
  units: UnitOfWork;
  file: string;
  close: () => Promise<void>;
}

/** Opens a store in a new folder and runs statements in it. */
export async function openTestStore(...statements: string[]): Promise<TestStore> {
  Logger.overrideLogger(false);
  const { folder, remove } = temporaryFolder();
  const sequelize = new Sequelize(storeOptions(folder));
  const sql = new Sql(sequelize);
  for (const statement of statements) await sql.run(statement);
  const close = async (): Promise<void> => {
    await sequelize.close();
    remove();
  };
  return { sequelize, sql, units: new UnitOfWork(sequelize), file: storeFile(folder), close };
}

/** A promise and the way to resolve it: tests let go of what waits without a clock. */
export function signal(): { given: Promise<void>; give: () => void } {
  let give: () => void = () => undefined;
  const given = new Promise<void>((resolve) => (give = resolve));
  return { given, give };
}

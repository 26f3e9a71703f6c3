import { Logger } from '@nestjs/common';
import path from 'node:path';
import { Sequelize as PlainSequelize } from 'sequelize';
import type { SequelizeOptions } from 'sequelize-typescript';
import { singleWriterDialect } from './single-writer';
import { transactionNamespace } from './unit-context';

/** The database's file in a data folder. */
export function storeFile(dataDir: string): string {
  return path.join(dataDir, 'lidwatch.sqlite');
}

/** How sequelize opens the store: one writer behind a gate, transactions from the context, no schema of its own. */
export function storeOptions(dataDir: string): SequelizeOptions {
  const logger = new Logger('Store');
  PlainSequelize.useCLS(transactionNamespace);
  return {
    dialect: 'sqlite',
    storage: storeFile(dataDir),
    dialectModule: singleWriterDialect((heldMs, lane) =>
      logger.warn(`The write handle was held for ${Math.round(heldMs)} ms (${lane} lane).`),
    ),
    logging: false,
    // The handles switch foreign keys on themselves; sequelize's own PRAGMA would wait at the gate.
    foreignKeys: false,
    retry: { max: 1 },
    define: { timestamps: false, underscored: true, freezeTableName: true },
  } as SequelizeOptions;
}

import path from 'node:path';
import { Database, OPEN_CREATE, OPEN_READWRITE } from 'sqlite3';
import { StartFault } from '../common/start-fault';
import { closeHandle } from './handles';

/**
 * Takes the data folder for this process: an exclusive transaction on a database of its own, which the system ends
 * when the process dies. Resolves with the way to give it back; throws a StartFault when another process has it.
 */
export async function lockDataDir(dataDir: string): Promise<() => Promise<void>> {
  const file = path.join(dataDir, 'lock.sqlite');
  const handle = await new Promise<Database>((resolve, reject) => {
    const opening: Database = new Database(file, OPEN_READWRITE | OPEN_CREATE, (error) =>
      error ? reject(cannotLock(dataDir, error)) : resolve(opening),
    );
  });
  const error = await new Promise<Error | null>((resolve) => handle.exec('BEGIN EXCLUSIVE', resolve));
  if (error) {
    await closeHandle(handle);
    throw cannotLock(dataDir, error);
  }
  return () => closeHandle(handle);
}

function cannotLock(dataDir: string, error: Error & { code?: string }): StartFault {
  return error.code === 'SQLITE_BUSY'
    ? new StartFault(
        `Lidwatch already runs on the data folder ${dataDir}: stop it first, or set DATA_DIR to another folder.`,
      )
    : new StartFault(
        `The data folder ${dataDir} cannot be locked (${error.message}): set DATA_DIR to a folder that can be written.`,
      );
}

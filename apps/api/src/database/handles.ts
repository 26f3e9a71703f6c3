import { Database, OPEN_CREATE, OPEN_READONLY, OPEN_READWRITE } from 'sqlite3';

const readHandleCount = 3;
const busyTimeoutMs = 5000;
/** Pragmas hold per connection, so each handle sets its own. */
const writerPragmas =
  'PRAGMA journal_mode=WAL; PRAGMA synchronous=NORMAL; PRAGMA foreign_keys=ON; PRAGMA cache_size=-32000; PRAGMA temp_store=MEMORY;';
const readerPragmas = 'PRAGMA query_only=ON; PRAGMA cache_size=-32000; PRAGMA temp_store=MEMORY;';

/** The open connections to one database file: one that writes and a few that can only read. */
export interface Handles {
  writer: Database;
  readers: Database[];
}

/** Opens the writer first (it makes the file), then the readers. */
export async function openHandles(file: string): Promise<Handles> {
  const writer = await openHandle(file, OPEN_READWRITE | OPEN_CREATE, writerPragmas);
  const readers: Database[] = [];
  for (let i = 0; i < readHandleCount; i++)
    readers.push(await openHandle(file, OPEN_READONLY, readerPragmas));
  return { writer, readers };
}

/** Opens one connection with its pragmas set. */
export function openHandle(file: string, mode: number, pragmas: string): Promise<Database> {
  return new Promise((resolve, reject) => {
    const handle: Database = new Database(file, mode, (error) => {
      if (error) return reject(error);
      handle.configure('busyTimeout', busyTimeoutMs);
      // One statement after the other: a handle never occupies more than one thread, and COMMIT overtakes nothing.
      handle.serialize();
      handle.exec(pragmas, (fault) => (fault ? reject(fault) : resolve(handle)));
    });
  });
}

/** Closes every connection, the writer last, so that SQLite folds the write-ahead log in. */
export async function closeHandles({ writer, readers }: Handles): Promise<void> {
  for (const handle of [...readers, writer]) await closeHandle(handle);
}

/** Closes one connection. */
export function closeHandle(handle: Database): Promise<void> {
  return new Promise((resolve, reject) => handle.close((error) => (error ? reject(error) : resolve())));
}

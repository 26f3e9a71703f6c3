import { pathToFileURL } from 'node:url';
import { Fault } from './fault.mjs';
import { inRoot } from './root.mjs';

/** One sentence when another process has the data folder; found out before anything is started on it. */
export async function checkLock(dataDir) {
  const { default: lock } = await import(
    pathToFileURL(inRoot('apps/api/dist/database/process-lock.js')).href
  );
  let release;
  try {
    release = await lock.lockDataDir(dataDir);
  } catch (error) {
    throw error.name === 'StartFault' ? new Fault(error.message) : error;
  }
  await release();
}

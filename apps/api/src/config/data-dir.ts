import { randomBytes } from 'node:crypto';
import { accessSync, constants, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { StartFault } from '../common/start-fault';

/**
 * Makes the data folder if needed and returns its secret, made at the first start (readable by the owner only).
 * Throws a StartFault when the folder cannot be made or written, or its secret is damaged.
 */
export function prepareDataDir(dataDir: string): string {
  try {
    mkdirSync(dataDir, { recursive: true });
    accessSync(dataDir, constants.W_OK);
    return readOrMakeSecret(path.join(dataDir, 'secret'));
  } catch (error) {
    if (error instanceof StartFault) throw error;
    const reason = (error as NodeJS.ErrnoException).code ?? String(error);
    throw new StartFault(
      `The data folder ${dataDir} cannot be written (${reason}): set DATA_DIR to a folder that can.`,
    );
  }
}

function readOrMakeSecret(file: string): string {
  try {
    writeFileSync(file, randomBytes(32).toString('hex'), { flag: 'wx', mode: 0o600 });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
  }
  const secret = readFileSync(file, 'utf8').trim();
  if (/^[0-9a-f]{64}$/.test(secret)) return secret;
  throw new StartFault(
    `${file} is damaged: remove it, and a new one is made (everybody has to sign in again).`,
  );
}

import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { StartFault } from '../common/start-fault';
import { temporaryFolder } from '../testing/temporary-folder';
import { lockDataDir } from './process-lock';

const sqlite3 = require.resolve('sqlite3');

describe('the lock of the data folder', () => {
  const { folder, remove } = temporaryFolder();
  afterAll(remove);

  it('is had by one only, and given back', async () => {
    const unlock = await lockDataDir(folder);
    await expect(lockDataDir(folder)).rejects.toThrow(StartFault);
    await expect(lockDataDir(folder)).rejects.toThrow(`already runs on the data folder ${folder}`);
    await unlock();
    await (
      await lockDataDir(folder)
    )();
  });

  it('is freed by the system when its process dies', async () => {
    const file = JSON.stringify(path.join(folder, 'lock.sqlite'));
    const script = `const { Database } = require(${JSON.stringify(sqlite3)});
      const handle = new Database(${file}, () => handle.exec('BEGIN EXCLUSIVE', (error) => { console.log(error ? 'refused' : 'had'); process.kill(process.pid, 'SIGKILL'); }));`;
    const dead = spawnSync(process.execPath, ['-e', script], { encoding: 'utf8', timeout: 20_000 });
    expect(dead.stdout.trim()).toBe('had');
    expect(dead.signal).toBe('SIGKILL');
    await (
      await lockDataDir(folder)
    )();
  });

  it('says in one sentence that a folder cannot be locked', async () => {
    await expect(lockDataDir(path.join(folder, 'missing'))).rejects.toThrow('cannot be locked');
  });
});

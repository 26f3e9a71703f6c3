import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync } from 'node:fs';
import path from 'node:path';

const main = path.resolve(__dirname, '../dist/main.js');

/** The built service as a process of its own. */
export interface BuiltService {
  /** Its address once it listens; rejects with what it said when it ends before. */
  address: Promise<string>;
  /** Everything it wrote to standard output so far. */
  log: () => string;
  ended: Promise<{ code: number | null; signal: string | null; stderr: string }>;
  kill: (signal: NodeJS.Signals) => void;
  pid: number | undefined;
}

/** Starts the built service on a data folder with these settings, without the demo and on a port of its own. */
export function startBuilt(dataDir: string, environment: Record<string, string> = {}): BuiltService {
  if (!existsSync(main)) throw new Error('Build the API first: npm run build.');
  const env = { PATH: process.env.PATH, DEMO: 'off', PORT: '0', DATA_DIR: dataDir, ...environment };
  const child = spawn(process.execPath, [main], { env, stdio: ['ignore', 'pipe', 'pipe'] });
  let stdout = '';
  let stderr = '';
  child.stderr.on('data', (text: Buffer) => (stderr += text.toString()));
  const ended = once(child, 'close').then(([code, signal]) => ({
    code: code as number | null,
    signal: signal as string | null,
    stderr,
  }));
  const address = new Promise<string>((resolve, reject) => {
    child.stdout.on('data', (text: Buffer) => {
      stdout += text.toString();
      const found = /Listening at http:\/\/\S+?:(\d+) /.exec(stdout);
      if (found) resolve(`http://127.0.0.1:${found[1]}`);
    });
    child.once('close', () => reject(new Error(`It ended before it listened: ${stderr}`)));
  });
  address.catch(() => undefined);
  return { address, log: () => stdout, ended, kill: (signal) => void child.kill(signal), pid: child.pid };
}

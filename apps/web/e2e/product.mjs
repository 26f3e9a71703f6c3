import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { until } from './until.mjs';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../../..');

/** A port that is free now. */
async function freePort() {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address();
  server.close();
  await once(server, 'close');
  return port;
}

/** Starts the built product as `npm start` does, empty, in a folder and on ports of its own. */
export async function startProduct() {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'lidwatch-journey-'));
  const [port, page, smtp, sms] = [await freePort(), await freePort(), await freePort(), await freePort()];
  const child = spawn(process.execPath, [path.join(root, 'scripts/start.mjs')], {
    env: {
      ...process.env,
      ...{ DEMO: 'off', PORT: String(port), DATA_DIR: path.join(folder, 'data') },
      ...{ LOCAL_PAGE_PORT: String(page), LOCAL_SMTP_PORT: String(smtp), LOCAL_SMS_PORT: String(sms) },
      SMS_UNDELIVERED_SHARE: '0',
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let said = '';
  for (const stream of [child.stdout, child.stderr])
    stream.setEncoding('utf8').on('data', (text) => (said += text));
  const stop = async () => {
    if (child.exitCode === null && child.signalCode === null) {
      child.kill('SIGINT');
      await once(child, 'close');
    }
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    await until('the product says its first link', () => /\/welcome\/[\w-]+/.test(said), 120_000);
  } catch (error) {
    await stop();
    throw new Error(`${error.message}\nWhat it said:\n${said}`, { cause: error });
  }
  const url = `http://localhost:${port}`;
  await until('the product is ready', async () => (await fetch(`${url}/health/ready`)).ok, 60_000);
  return {
    url,
    inbox: `http://127.0.0.1:${page}`,
    loggerDir: path.join(folder, 'data/loggers'),
    firstLink: /(https?:\/\/\S*\/welcome\/[\w-]+)/.exec(said)[1],
    said: () => said,
    stop,
  };
}

import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
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

/** So that the product ends with this script, however that ends. */
const endWithParent = pathToFileURL(path.join(root, 'scripts/house/end-with-parent.mjs')).href;
const PATIENCE_MS = 15_000;
const FIRST_LINK = /https?:\/\/\S*\/welcome\/[\w-]+/;
const UP = /Ctrl-C stops it all/;

/**
 * Starts the built product as `npm start` does, on ports of its own and in a new folder, or in one that it was stopped
 * in before (`stop({ keep: true })`).
 */
export async function startProduct({ folder: kept } = {}) {
  const folder = kept ?? mkdtempSync(path.join(os.tmpdir(), 'lidwatch-journey-'));
  const [port, page, smtp, sms] = [await freePort(), await freePort(), await freePort(), await freePort()];
  const child = spawn(process.execPath, ['--import', endWithParent, path.join(root, 'scripts/start.mjs')], {
    env: {
      ...process.env,
      ...{ DEMO: 'off', PORT: String(port), DATA_DIR: path.join(folder, 'data') },
      ...{ LOCAL_PAGE_PORT: String(page), LOCAL_SMTP_PORT: String(smtp), LOCAL_SMS_PORT: String(sms) },
      SMS_UNDELIVERED_SHARE: '0',
    },
    stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
  });
  let said = '';
  for (const stream of [child.stdout, child.stderr])
    stream.setEncoding('utf8').on('data', (text) => (said += text));
  const stop = async ({ keep = false } = {}) => {
    if (child.exitCode === null && child.signalCode === null) {
      child.kill('SIGINT');
      const timer = setTimeout(() => child.kill('SIGKILL'), PATIENCE_MS);
      await once(child, 'close');
      clearTimeout(timer);
    }
    if (!keep) rmSync(folder, { recursive: true, force: true });
  };
  try {
    await until(
      'the product is up and has said its first link',
      () => UP.test(said) && (kept !== undefined || FIRST_LINK.test(said)),
      120_000,
    );
  } catch (error) {
    await stop();
    throw new Error(`${error.message}\nWhat it said:\n${said}`, { cause: error });
  }
  return {
    url: `http://localhost:${port}`,
    inbox: `http://127.0.0.1:${page}`,
    loggerDir: path.join(folder, 'data/loggers'),
    folder,
    firstLink: FIRST_LINK.exec(said)?.[0],
    said: () => said,
    stop,
  };
}

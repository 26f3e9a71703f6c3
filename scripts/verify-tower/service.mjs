import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');
const main = path.join(root, 'apps/api/dist/main.js');
const START_MS = 60_000;
const STOP_MS = 10_000;
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

const freePort = () =>
  new Promise((resolve, reject) => {
    const server = createServer().once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });

const run = (file, args) =>
  new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [file, ...args], { cwd: root, stdio: 'inherit' });
    child.once('error', reject);
    child.once('exit', (code) => (code === 0 ? resolve() : reject(new Error(`${file} ended with ${code}.`))));
  });

const LINK_MS = 5_000;

/** The token of the link printed at start. */
const tokenIn = async (output) => {
  const until = Date.now() + LINK_MS;
  while (Date.now() < until) {
    const token = /\/welcome\/([\w.~-]+)/.exec(output())?.[1];
    if (token) return token;
    await pause(50);
  }
  throw new Error('The service printed no link for the first administrator.');
};

const waitUntilReady = async (url, ended) => {
  const until = Date.now() + START_MS;
  while (Date.now() < until) {
    if (ended()) throw new Error('The service ended before it was ready.');
    const answer = await fetch(`${url}/health/ready`).catch(() => undefined);
    if (answer?.ok) return;
    await pause(200);
  }
  throw new Error(`The service was not ready within ${START_MS / 1000} s.`);
};

const stop = async (child) => {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const ended = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGTERM');
  await Promise.race([ended, pause(STOP_MS)]);
  if (child.exitCode === null && child.signalCode === null) child.kill('SIGKILL');
};

/**
 * Starts the built service on a free port with an empty store of its own (building it first where it never was), and
 * gives its address, the first administrator's token, and the way to stop it and remove the store.
 */
export async function startService() {
  if (!existsSync(main)) await run(path.join(root, 'scripts/build.mjs'), []);
  const dataDir = await mkdtemp(path.join(tmpdir(), 'lidwatch-verify-'));
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const env = { ...process.env, PORT: String(port), DATA_DIR: dataDir, DEMO: 'off', PUBLIC_URL: url };
  env.LOGGER_DIR = path.join(dataDir, 'loggers');
  // The first administrator's link is a warning in the log.
  env.LOG_LEVEL = 'warn';
  const child = spawn(process.execPath, [main], { cwd: root, env, stdio: ['ignore', 'pipe', 'pipe'] });
  let output = '';
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (text) => (output += text));
  const close = async () => {
    await stop(child);
    await rm(dataDir, { recursive: true, force: true });
  };
  try {
    await waitUntilReady(url, () => child.exitCode !== null);
    return { url, token: await tokenIn(() => output), pid: child.pid, close };
  } catch (error) {
    await close();
    throw new Error(`${error.message}\n${output.slice(-4000)}`, { cause: error });
  }
}

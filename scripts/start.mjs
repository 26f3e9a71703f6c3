import { setTimeout as pause } from 'node:timers/promises';
import { ensureBuilt } from './house/build-steps.mjs';
import { startChild } from './house/child.mjs';
import { Fault, runMain } from './house/fault.mjs';
import { ensureInstalled } from './house/install.mjs';
import { checkLock } from './house/lock.mjs';
import { printWelcome } from './house/welcome.mjs';
import { startSettings } from './house/start-settings.mjs';
import { readinessOf } from './house/readiness.mjs';

const LOOK_EVERY_MS = 300;

/** Waits until a program answers that it is ready, or says that it ended instead. */
async function waitReady(child, url, onProgress = () => undefined) {
  let ended;
  child.ended.then((how) => (ended = { how }));
  for (;;) {
    const { ready, progress } = await readinessOf(url);
    if (ready) return;
    if (ended)
      throw new Fault(
        `The ${child.name} ended (${ended.how}) before it was ready; what it said stands above.`,
      );
    if (progress) onProgress(progress);
    await pause(LOOK_EVERY_MS);
  }
}

/** Shows how far the demo's history is, on one line where the terminal can do that. */
function progressLine() {
  let last = '';
  return (text) => {
    if (text === last) return;
    last = text;
    process.stdout.write(process.stdout.isTTY ? `\r\x1b[K${text}` : `${text}\n`);
  };
}

await runMain(async () => {
  await ensureInstalled();
  await ensureBuilt();
  const env = await startSettings();
  await checkLock(env.DATA_DIR);

  const children = [];
  let stopping;
  const stop = (code) => {
    stopping ??= Promise.all(children.map((child) => child.stop())).then(() => process.exit(code));
    return stopping;
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.once(signal, () => void stop(0));
  const start = (name, file) => {
    const child = startChild(name, file, env, (line) => console.log(line));
    children.push(child);
    return child;
  };

  try {
    const local = start('local services', 'apps/local-services/dist/main.js');
    await waitReady(local, `${env.LOCAL_SERVICES_URL}/ready`);
    const server = start('server', 'apps/api/dist/main.js');
    await waitReady(server, `http://127.0.0.1:${env.PORT}/health/ready`, progressLine());
    printWelcome(env);
    const [gone, how] = await Promise.race(children.map((child) => child.ended.then((end) => [child, end])));
    if (!stopping)
      console.error(
        `The ${gone.name} ended by itself (${how}); the rest is stopped. Start again with npm start.`,
      );
    await stop(1);
  } catch (error) {
    if (!stopping) console.error(error instanceof Fault ? error.message : error);
    await stop(1);
  }
});

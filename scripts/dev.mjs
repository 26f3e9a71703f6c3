import { binOf } from './house/command.mjs';
import { startChild } from './house/child.mjs';
import { ensureBuilt } from './house/build-steps.mjs';
import { runMain } from './house/fault.mjs';
import { ensureInstalled } from './house/install.mjs';
import { startSettings } from './house/start-settings.mjs';
import { spawn } from 'node:child_process';
import { inRoot, root } from './house/root.mjs';

/** Development: rebuilds and restarts on every change; Vite serves the pages and passes the rest on to the server. */
await runMain(async () => {
  await ensureInstalled();
  await ensureBuilt();
  const env = { ...process.env, ...(await startSettings()) };
  const node = (args, cwd = root) => spawn(process.execPath, args, { cwd, env, stdio: 'inherit' });
  const local = startChild('local services', 'apps/local-services/dist/main.js', env, console.log);
  const others = [
    node([
      binOf('typescript/bin/tsc'),
      '-b',
      '-w',
      '--preserveWatchOutput',
      'apps/api',
      'apps/local-services',
    ]),
    node(['--enable-source-maps', '--watch', inRoot('apps/api/dist/main.js')]),
    node([binOf('vite/bin/vite.js')], inRoot('apps/web')),
  ];
  const stop = async () => {
    for (const child of others) child.kill('SIGTERM');
    await local.stop();
    process.exit(0);
  };
  process.once('SIGINT', () => void stop());
  process.once('SIGTERM', () => void stop());
});

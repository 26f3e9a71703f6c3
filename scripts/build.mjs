import { ensureBuilt } from './house/build-steps.mjs';
import { runMain } from './house/fault.mjs';
import { ensureInstalled } from './house/install.mjs';

await runMain(async () => {
  await ensureInstalled();
  await ensureBuilt(process.argv.includes('--all'));
  console.log('Built.');
});

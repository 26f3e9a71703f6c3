import { runBin } from './house/command.mjs';
import { runMain } from './house/fault.mjs';

/** Every project that is checked without being built, specs included. */
const PROJECTS = [
  'packages/tooling/tsconfig.specs.json',
  'apps/api/tsconfig.specs.json',
  'apps/local-services/tsconfig.specs.json',
  'apps/web/tsconfig.json',
];

await runMain(async () => {
  let failed = 0;
  for (const project of PROJECTS) {
    const { code } = await runBin('typescript/bin/tsc', ['-p', project, '--noEmit']);
    if (code !== 0) failed += 1;
  }
  console.log(`types: ${PROJECTS.length - failed} projects in order, ${failed} not`);
  process.exitCode = failed === 0 ? 0 : 1;
});

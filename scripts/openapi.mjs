/**
 * Writes the web's request and response types from the API's own description. `--check` writes nothing and ends with
 * 1 when the file in the repository differs. The API must be built (`npm run build`).
 */
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import os from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import openapiTS, { astToString } from 'openapi-typescript';
import prettier from 'prettier';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..');
const built = path.join(root, 'apps/api/dist/describe.js');
const target = path.join(root, 'apps/web/src/lib/api/schema.d.ts');
const header =
  "/** Written by `npm run openapi` from the API's description; change the API, not this file. */\n";

if (!existsSync(built)) fail('The API is not built yet: run npm run build first.');
const dataDir = mkdtempSync(path.join(os.tmpdir(), 'lidwatch-openapi-'));
try {
  Object.assign(process.env, { DATA_DIR: dataDir, DEMO: 'off', LOG_LEVEL: 'silent' });
  const { describeService } = createRequire(import.meta.url)(built);
  const types = astToString(await openapiTS(await describeService()));
  const options = { ...(await prettier.resolveConfig(target)), parser: 'typescript' };
  const text = await prettier.format(header + types, options);
  if (process.argv.includes('--check')) check(text);
  else writeFileSync(target, text);
} finally {
  rmSync(dataDir, { recursive: true, force: true });
}

function check(text) {
  const kept = existsSync(target) ? readFileSync(target, 'utf8') : '';
  if (kept !== text)
    fail('apps/web/src/lib/api/schema.d.ts differs from the API: run npm run openapi and commit it.');
  console.log("The web's types agree with the API.");
}

function fail(sentence) {
  console.error(sentence);
  process.exitCode = 1;
  if (!existsSync(built)) process.exit(1);
}

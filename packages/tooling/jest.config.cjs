const path = require('node:path');
const root = path.resolve(__dirname, '../..');

const sources = Object.fromEntries(
  ['atmosphere', 'rules', 'contracts'].map((name) => [
    `^@lidwatch/${name}$`,
    path.join(root, 'packages', name, 'src/index.ts'),
  ]),
);
const compiler = {
  target: 'es2023',
  module: 'commonjs',
  moduleResolution: 'bundler',
  esModuleInterop: true,
  isolatedModules: true,
  strict: true,
  resolveJsonModule: true,
  types: ['node', 'jest'],
};
const nest = { experimentalDecorators: true, emitDecoratorMetadata: true, useDefineForClassFields: false };

/** One Jest project: a workspace, where it runs, and what its TypeScript needs besides the common settings. */
const project = (folder, { environment = 'node', tsconfig = {}, roots = ['src'], ...rest } = {}) => ({
  displayName: path.basename(folder),
  rootDir: path.join(root, folder),
  roots: roots.map((r) => `<rootDir>/${r}`),
  testMatch: ['**/*.spec.ts', '**/*.spec.tsx', '**/*.e2e-spec.ts'],
  testEnvironment: environment,
  transform: { '^.+\\.tsx?$': ['ts-jest', { tsconfig: { ...compiler, ...tsconfig } }] },
  moduleNameMapper: { ...sources, '\\.css$': path.join(__dirname, 'empty.cjs'), ...rest.moduleNameMapper },
  ...(rest.setupFilesAfterEnv && { setupFilesAfterEnv: rest.setupFilesAfterEnv }),
});

/** @type {import('jest').Config} */
module.exports = {
  rootDir: root,
  // A backstop against what hangs, not a measure: on a busy machine a service takes its time to start.
  testTimeout: 60_000,
  // Jest leaves a core free for its own work, which of two cores is half the machine.
  maxWorkers: '100%',
  projects: [
    project('packages/atmosphere'),
    project('packages/rules'),
    project('packages/contracts'),
    project('apps/api', { tsconfig: nest, roots: ['src', 'test'] }),
    project('apps/local-services', { tsconfig: nest }),
    project('apps/web', {
      environment: path.join(root, 'apps/web/src/test/environment.cjs'),
      tsconfig: { jsx: 'react-jsx', types: ['node', 'jest', '@testing-library/jest-dom'] },
      setupFilesAfterEnv: [path.join(root, 'apps/web/src/test/setup.ts')],
      moduleNameMapper: { '^d3-(geo|array)$': path.join(root, 'node_modules/d3-$1/dist/d3-$1.js') },
    }),
  ],
};

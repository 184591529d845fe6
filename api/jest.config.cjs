/** @type {import('jest').Config} */
module.exports = {
  testEnvironment: 'node',
  // The `source` condition reads the TypeScript of the workspace packages, so tests need no build.
  testEnvironmentOptions: { customExportConditions: ['source', 'node', 'node-addons', 'require', 'default'] },
  roots: ['<rootDir>/src', '<rootDir>/test'],
  testMatch: ['**/*.spec.ts', '**/*.e2e-spec.ts'],
  setupFiles: ['<rootDir>/test/support/environment.ts'],
  maxWorkers: 2,
  // A worker keeps what every spec loaded; grown past this it is replaced. Near a gigabyte, Node.js takes longer to give
  // the memory back than Jest waits for a worker to end, and Jest then speaks of leaks where nothing is left open.
  workerIdleMemoryLimit: '500MB',
  testTimeout: 20_000,
  transform: {
    '^.+\\.ts$': [
      '@swc/jest',
      {
        jsc: {
          parser: { syntax: 'typescript', decorators: true },
          transform: { legacyDecorator: true, decoratorMetadata: true, useDefineForClassFields: false },
          target: 'es2022',
        },
        module: { type: 'commonjs' },
        sourceMaps: 'inline',
      },
    ],
  },
  transformIgnorePatterns: ['/node_modules/'],
};

import { defineConfig } from 'vitest/config';

// The `source` condition reads the TypeScript of the workspace packages, so tests need no build.
const conditions = ['source', 'node', 'import', 'default'];

export default defineConfig({
  resolve: { conditions },
  ssr: { resolve: { conditions } },
  test: { include: ['src/**/*.spec.ts', 'test/**/*.spec.ts'] },
});

import react from '@vitejs/plugin-react';
import { defaultClientConditions, loadEnv } from 'vite';
import { defineConfig } from 'vitest/config';

export default defineConfig(({ mode }) => ({
  plugins: [react()],
  resolve: {
    // The workspace's packages are read as TypeScript, so nothing has to be built before.
    conditions: ['source', ...defaultClientConditions],
  },
  server: {
    // API_ADDRESS when the API does not listen where `npm start` puts it by default.
    proxy: Object.fromEntries(
      ['/api', '/livez', '/readyz'].map((path) => [
        path,
        loadEnv(mode, '.', 'API_').API_ADDRESS ?? 'http://127.0.0.1:3000',
      ]),
    ),
  },
  build: {
    outDir: 'dist',
    emptyOutDir: true,
    sourcemap: false,
    // Fonts stay files: they are cached for good and only what a page needs is fetched.
    assetsInlineLimit: 0,
  },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.spec.{ts,tsx}'],
    setupFiles: ['test/setup.ts'],
    css: false,
    // Two cores shared with a database and a browser: a form typed key by key may take a while.
    testTimeout: 20_000,
    restoreMocks: true,
    unstubGlobals: true,
  },
}));

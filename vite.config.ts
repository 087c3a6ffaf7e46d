import tailwind from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { build } from 'vite';
import { defineConfig } from 'vitest/config';
import { bundleSizes } from './server/house/bundle-sizes.mjs';
import { offlineBuild } from './server/house/offline-build.mjs';

const apiPort = process.env['API_PORT'] ?? '4311';

/** Tests that need no database and no browser, and those that do, are separate projects of one runner. */
const nodeTests = (name: string, include: string[], extra: object = {}) => ({
  extends: true as const,
  test: { name, include, environment: 'node', ...extra },
});

export default defineConfig({
  plugins: [react(), tailwind(), bundleSizes(), offlineBuild(build)],
  publicDir: 'client/public',
  build: {
    outDir: 'node_modules/.cache/featherbeam/client',
    emptyOutDir: true,
    target: 'es2022',
    sourcemap: false,
  },
  worker: { format: 'es' },
  server: { host: '127.0.0.1', proxy: { '/api': `http://127.0.0.1:${apiPort}` } },
  test: {
    reporters: ['default'],
    projects: [
      nodeTests('unit', ['tests/{shared,published,architecture,docs,client,bench}/**/*.test.{ts,tsx}']),
      nodeTests('api', ['tests/server/**/*.test.ts'], {
        globalSetup: ['tests/server/global-setup.ts'],
        testTimeout: 30_000,
        hookTimeout: 60_000,
      }),
      nodeTests('e2e', ['tests/e2e/**/*.test.ts'], {
        globalSetup: ['tests/e2e/global-setup.ts'],
        testTimeout: 240_000,
        hookTimeout: 240_000,
        fileParallelism: false,
      }),
    ],
  },
});

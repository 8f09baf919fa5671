import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';
import { initialBudget } from './scripts/lib/initial-budget.mjs';

export default defineConfig({
  plugins: [react(), tailwindcss(), initialBudget()],
  publicDir: 'src/public',
  // No assets as data: addresses: the content security policy allows fonts and pictures from the server alone.
  build: { outDir: 'dist', sourcemap: true, target: 'es2022', assetsInlineLimit: 0 },
  // Workers are modules of their own, fetched from the server alone.
  worker: { format: 'es' },
  server: { port: 4601, proxy: { '/api': 'http://127.0.0.1:4600' } },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: ['shared/**/*.test.ts', 'server/**/*.test.ts', 'scripts/**/*.test.ts'],
          environment: 'node',
          env: { TZ: 'UTC' },
        },
      },
      {
        // The same pure code in a zone far from UTC with an odd offset: a hidden local-time dependence fails here.
        extends: true,
        test: {
          name: 'far-zone',
          include: ['shared/**/*.test.ts'],
          environment: 'node',
          env: { TZ: 'Pacific/Chatham' },
        },
      },
      {
        extends: true,
        test: {
          name: 'client',
          include: ['src/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          env: { TZ: 'UTC' },
        },
      },
      {
        extends: true,
        test: {
          name: 'reference',
          include: ['tests/reference/**/*.test.ts'],
          environment: 'node',
          env: { TZ: 'UTC' },
        },
      },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          environment: 'node',
          env: { TZ: 'UTC' },
          globalSetup: ['tests/setup/services.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
          maxWorkers: 2,
        },
      },
      {
        extends: true,
        test: {
          name: 'pipeline',
          include: ['tests/pipeline/**/*.test.ts'],
          environment: 'node',
          env: { TZ: 'UTC' },
          globalSetup: ['tests/setup/services.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
          maxWorkers: 2,
        },
      },
      {
        extends: true,
        test: {
          name: 'faults',
          include: ['tests/faults/**/*.test.ts'],
          environment: 'node',
          env: { TZ: 'UTC' },
          globalSetup: ['tests/setup/fault-services.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          // They stop the stores that all of them work on.
          maxWorkers: 1,
          fileParallelism: false,
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          env: { TZ: 'UTC' },
          globalSetup: ['tests/setup/services.ts'],
          testTimeout: 240_000,
          hookTimeout: 120_000,
          maxWorkers: 1,
        },
      },
    ],
  },
});

import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const node = { environment: 'node' as const, pool: 'forks' as const };

/** Four kinds of tests; `npm test -- --project shared` runs one of them. */
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          ...node,
          name: 'shared',
          include: [
            'tests/shared/**/*.test.ts',
            'tests/scripts/**/*.test.ts',
            'tests/demo/**/*.test.ts',
          ],
          testTimeout: 60_000,
        },
      },
      {
        test: {
          ...node,
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: 'tests/helpers/databaseSetup.ts',
          testTimeout: 60_000,
          hookTimeout: 60_000,
          env: { NODE_ENV: 'test' },
        },
      },
      {
        plugins: [react()],
        test: {
          name: 'src',
          environment: 'jsdom',
          include: ['tests/src/**/*.test.{ts,tsx}'],
          testTimeout: 20_000,
        },
      },
      {
        test: {
          ...node,
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: 'tests/helpers/productSetup.ts',
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});

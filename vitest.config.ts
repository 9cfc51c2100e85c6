import { defineConfig } from 'vitest/config';

const node = { environment: 'node' as const };

export default defineConfig({
  test: {
    projects: [
      {
        test: {
          ...node,
          name: 'engine',
          include: ['tests/engine/**/*.test.{ts,tsx}'],
          setupFiles: 'tests/support/fastCheckSeed.ts',
          testTimeout: 60_000,
        },
      },
      {
        test: {
          ...node,
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: 'tests/support/postgres.ts',
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
      {
        test: {
          ...node,
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/support/postgres.ts', 'tests/support/build.ts'],
          testTimeout: 300_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
});

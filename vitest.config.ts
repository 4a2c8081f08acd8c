import { defineConfig } from 'vitest/config';

const alias = { '@': import.meta.dirname };

/**
 * `unit` needs nothing but Node; `database` clones a migrated template database per file;
 * `browser` starts the built application and drives Debian's Chromium.
 */
export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'unit',
          include: [
            'tests/{evaluation,standards,external,drawing,units,planning,architecture,records}/**/*.test.{ts,tsx}',
          ],
          testTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'database',
          include: ['tests/{db,api,reports,faults}/**/*.test.{ts,tsx}'],
          globalSetup: ['tests/helpers/database-setup.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          maxWorkers: 2,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/helpers/application-setup.ts'],
          testTimeout: 240_000,
          hookTimeout: 240_000,
          fileParallelism: false,
        },
      },
    ],
  },
});

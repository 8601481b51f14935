import { defineConfig } from 'vitest/config';

const SECOND = 1000;

export default defineConfig({
  test: {
    pool: 'forks',
    maxWorkers: 2,
    restoreMocks: true,
    projects: [
      { extends: true, test: { name: 'domain', include: ['tests/domain/**/*.test.ts'] } },
      {
        extends: true,
        test: {
          name: 'server',
          include: ['tests/server/**/*.test.{ts,tsx}'],
          // One migrated database file, made once and cloned by every test file.
          globalSetup: ['tests/support/template-database.ts'],
          testTimeout: 15 * SECOND,
          hookTimeout: 30 * SECOND,
        },
      },
      {
        extends: true,
        test: {
          name: 'client',
          include: ['tests/client/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          setupFiles: ['tests/support/fail-on-console.ts'],
          testTimeout: 15 * SECOND,
        },
      },
      {
        extends: true,
        test: { name: 'architecture', include: ['tests/architecture/**/*.test.ts'], testTimeout: 30 * SECOND },
      },
      {
        extends: true,
        test: {
          name: 'regressions',
          include: ['tests/regressions/**/*.test.{ts,tsx}'],
          globalSetup: ['tests/support/template-database.ts'],
          testTimeout: 30 * SECOND,
          hookTimeout: 30 * SECOND,
        },
      },
      {
        extends: true,
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          // One site and one Chromium at a time: two at once on two cores time each other out.
          globalSetup: ['tests/browser/support/demo-site.ts'],
          fileParallelism: false,
          // Axe reads a page four times; on a machine with other work each takes seconds.
          testTimeout: 300 * SECOND,
          hookTimeout: 120 * SECOND,
        },
      },
      {
        extends: true,
        test: {
          name: 'long',
          include: ['tests/long/**/*.test.ts'],
          globalSetup: ['tests/support/template-database.ts'],
          fileParallelism: false,
          testTimeout: 30 * 60 * SECOND,
          hookTimeout: 120 * SECOND,
        },
      },
    ],
  },
});

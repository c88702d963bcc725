import { defineConfig } from 'vitest/config';

/** One project per kind of test, so that `npm test` can add the runs up and a developer can run one kind alone. */
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          include: ['tests/shared/**/*.test.ts', 'tests/reference/**/*.test.ts', 'tests/*.test.ts'],
          exclude: ['tests/reference/real-rooms.test.ts'],
          environment: 'node',
          setupFiles: ['./tests/support/property-seed.ts'],
        },
      },
      {
        test: {
          name: 'web',
          include: ['tests/web/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          setupFiles: ['./tests/support/web-setup.ts', './tests/support/property-seed.ts'],
        },
      },
      {
        oxc: { decorator: { legacy: true } },
        test: {
          name: 'api',
          globalSetup: ['./tests/support/global-setup.ts'],
          include: ['tests/api/**/*.test.ts', 'tests/reference/real-rooms.test.ts'],
          environment: 'node',
          setupFiles: ['./tests/support/property-seed.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        oxc: { decorator: { legacy: true } },
        test: {
          name: 'e2e',
          globalSetup: ['./tests/support/global-setup.ts'],
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          testTimeout: 180_000,
          hookTimeout: 180_000,
          fileParallelism: false,
        },
      },
    ],
  },
});

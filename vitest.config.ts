import { getViteConfig } from 'astro/config';
import { defineConfig } from 'vitest/config';

// The machines this runs on have two cores.
const MAX_WORKERS = 2;

const setupFiles = ['./tests/support/failOnConsoleError.ts'];
// A limit against hanging, generous because the machine may be busy with something else.
const timeouts = { testTimeout: 30_000, hookTimeout: 60_000 };

export default defineConfig({
  test: {
    maxWorkers: MAX_WORKERS,
    projects: [
      {
        test: {
          ...timeouts,
          name: 'lib',
          environment: 'node',
          // Pure functions leave nothing behind, and loading them anew for each file takes longest.
          isolate: false,
          include: ['tests/{lib,reference,schemas}/**/*.test.ts'],
          setupFiles,
        },
      },
      {
        test: {
          ...timeouts,
          name: 'run',
          environment: 'node',
          include: ['tests/run/**/*.test.ts'],
          setupFiles,
        },
      },
      {
        test: {
          ...timeouts,
          name: 'components',
          environment: 'jsdom',
          include: ['tests/{components,client}/**/*.test.{ts,tsx}'],
          setupFiles,
        },
      },
      getViteConfig({
        test: {
          ...timeouts,
          name: 'api',
          environment: 'node',
          include: ['tests/{server,pages,db}/**/*.test.{ts,tsx}'],
          globalSetup: ['./tests/support/databaseForRun.ts'],
          setupFiles: ['./tests/support/databaseForWorker.ts', ...setupFiles],
        },
      }),
    ],
  },
});

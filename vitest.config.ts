import { getViteConfig } from 'astro/config';
import { defineConfig } from 'vitest/config';

const consoleErrors = './tests/support/failOnConsoleError.ts';

// The machines this runs on have two cores.
const MAX_WORKERS = 2;

export default defineConfig({
  test: {
    maxWorkers: MAX_WORKERS,
    projects: [
      {
        test: {
          name: 'lib',
          environment: 'node',
          include: ['tests/{lib,reference,schemas}/**/*.test.ts'],
          setupFiles: [consoleErrors],
        },
      },
      {
        test: {
          name: 'run',
          environment: 'node',
          include: ['tests/run/**/*.test.ts'],
          setupFiles: [consoleErrors],
        },
      },
      {
        test: {
          name: 'components',
          environment: 'jsdom',
          include: ['tests/{components,client}/**/*.test.{ts,tsx}'],
          setupFiles: [consoleErrors],
        },
      },
      getViteConfig({
        test: {
          name: 'api',
          environment: 'node',
          include: ['tests/{server,pages,db}/**/*.test.{ts,tsx}'],
          globalSetup: ['./tests/support/databaseForRun.ts'],
          setupFiles: ['./tests/support/databaseForWorker.ts', consoleErrors],
        },
      }),
    ],
  },
});

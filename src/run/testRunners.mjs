import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureChromium } from './chromium.mjs';
import { stateSubfolder } from './paths.mjs';
import { runTool } from './scripts.mjs';
import { openDisposableSite } from './site.mjs';

/** @typedef {import('./testChecks.mjs').Counts} Counts */

/** Vitest, every project. @returns {Promise<Counts>} */
export async function runUnitTests() {
  return countTests(
    'vitest.json',
    async (report) => {
      const args = ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
      return runTool('vitest/vitest.mjs', { args, show: true });
    },
    ({ numPassedTests, numFailedTests, numPendingTests, numTodoTests }) => ({
      passed: numPassedTests,
      failed: numFailedTests,
      skipped: numPendingTests + numTodoTests,
    }),
  );
}

/**
 * Playwright against the built site.
 * @param {import('./resources.mjs').Resources} resources
 * @param {import('./databaseServer.mjs').DatabaseServer} server @returns {Promise<Counts>}
 */
export async function runBrowserTests(resources, server) {
  const chromium = await ensureChromium();
  const { url, env } = await openDisposableSite(resources, server, 'browser');
  return countTests(
    'playwright.json',
    async (report) => {
      const args = ['test', '--config', 'tests/browser/playwright.config.ts'];
      return runTool('@playwright/test/cli.js', {
        args: [...args, '--reporter', 'list,json', '--output', stateSubfolder('test', 'browser')],
        env: {
          ...env,
          BASE_URL: url,
          CHROMIUM_PATH: chromium,
          PLAYWRIGHT_JSON_OUTPUT_FILE: report,
        },
        show: true,
      });
    },
    ({ stats }) => ({
      passed: stats.expected + stats.flaky,
      failed: stats.unexpected,
      skipped: stats.skipped,
    }),
  );
}

/**
 * Runs a test runner and reads its report. One that fails without a failed test (a file that does
 * not load, an error between tests) counts as one failure.
 * @param {string} name @param {(report: string) => Promise<{ code: number }>} runner
 * @param {(report: any) => Counts} count
 */
async function countTests(name, runner, count) {
  const report = join(stateSubfolder('test'), name);
  rmSync(report, { force: true });
  const { code } = await runner(report);
  const counts = readCounts(report, count);
  return code !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;
}

/** @param {string} report @param {(report: any) => Counts} count @returns {Counts} */
function readCounts(report, count) {
  try {
    return count(JSON.parse(readFileSync(report, 'utf8')));
  } catch {
    return { passed: 0, failed: 1 };
  }
}

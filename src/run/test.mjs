import { openResources } from './resources.mjs';
import { RunError, runMain, say } from './say.mjs';
import { openServices } from './site.mjs';
import { runBrowserTests, runUnitTests } from './testRunners.mjs';
import { checks } from './testChecks.mjs';

/**
 * `npm test`: the checks, two at a time, then the tests, which use both cores themselves.
 * `npm test -- unit browser` runs only what is named.
 */
async function test() {
  const steps = { ...checks, unit: runUnitTests, browser: runBrowserTests };
  const asked = process.argv.slice(2);
  const unknown = asked.find((name) => !(name in steps));
  if (unknown) {
    throw new RunError(`"${unknown}" is not one of: ${Object.keys(steps).join(', ')}`);
  }
  const isAsked = (name) => asked.length === 0 || asked.includes(name);

  const resources = openResources();
  /** @type {({ name: string } & Counts)[]} */
  const results = [];
  try {
    const server = await openServices(resources);
    const step = async (name) => {
      if (isAsked(name)) results.push(await timed(name, () => steps[name](resources, server)));
    };
    // `astro check` and `astro build` both write .astro, so they take turns.
    const lanes = [
      ['check', 'build'],
      ['migrations', 'lint', 'format', 'unused'],
    ];
    await Promise.all(
      lanes.map(async (lane) => {
        for (const name of lane) await step(name);
      }),
    );
    await step('unit');
    await step('browser');
  } finally {
    await resources.close();
  }
  return summarise(results);
}

/** @typedef {import('./testChecks.mjs').Counts} Counts */

/** A step that throws has failed; the others still run. @param {string} name @param {() => Promise<Counts>} work */
async function timed(name, work) {
  const startedMs = Date.now();
  /** @type {Counts} */
  let counts;
  try {
    counts = await work();
  } catch (error) {
    const output = error instanceof RunError ? error.message : (error?.stack ?? String(error));
    counts = { passed: 0, failed: 1, output };
  }
  const seconds = ((Date.now() - startedMs) / 1000).toFixed(1);
  say(`${counts.failed === 0 ? 'ok    ' : 'FAILED'} ${name} (${seconds} s)`);
  if (counts.failed > 0 && counts.output) say(`\n${counts.output.trim()}\n`);
  return { name, ...counts };
}

/** @param {({ name: string } & Counts)[]} results @returns {number} the exit code */
function summarise(results) {
  say('');
  for (const { name, passed, failed, skipped } of results) {
    const extra = skipped ? `, ${skipped} skipped` : '';
    say(`${name.padEnd(12)} ${passed} passed, ${failed} failed${extra}`);
  }
  const sum = (key) => results.reduce((total, result) => total + (result[key] ?? 0), 0);
  say(`\n${sum('passed')} passed, ${sum('failed')} failed`);
  return sum('failed') === 0 && results.length > 0 ? 0 : 1;
}

await runMain(test);

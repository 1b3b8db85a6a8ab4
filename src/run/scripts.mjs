import { join } from 'node:path';
import { root } from './paths.mjs';
import { run, runOrThrow } from './processes.mjs';

/** @typedef {{ args?: string[], env?: NodeJS.ProcessEnv, show?: boolean }} ScriptOptions */

/** Runs a TypeScript file of ours; a failure is thrown. @param {string} file @param {ScriptOptions} options */
export const runTypeScript = (file, { args = [], env, show }) =>
  runOrThrow(file, process.execPath, ['--import', 'tsx', file, ...args], {
    env: { ...process.env, ...env },
    show,
  });

/**
 * Runs a tool from node_modules under this very Node, so that ending us ends it: npx would leave
 * its child behind.
 * @param {string} script inside node_modules @param {ScriptOptions} options
 */
export const runTool = (script, { args = [], env, show }) =>
  run(process.execPath, [join(root, 'node_modules', script), ...args], {
    env: { ...process.env, ...colour, ASTRO_TELEMETRY_DISABLED: '1', ...env },
    show,
  });

/** What a tool prints passes through a pipe, so it cannot see whether it ends on a screen. */
const colour = process.stdout.isTTY
  ? { FORCE_COLOR: '1' }
  : { NO_COLOR: '1', FORCE_COLOR: undefined };

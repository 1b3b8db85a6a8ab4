import { spawn, spawnSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { root } from './paths.mjs';
import { RunError } from './say.mjs';

/** @typedef {{ pid: number, started: string }} ProcessIdentity */

/**
 * Tells one process from a later one with the same number; undefined when there is none.
 * @param {number} pid @returns {ProcessIdentity | undefined}
 */
export function identify(pid) {
  const started = existsSync('/proc/self/stat') ? startedFromProc(pid) : startedFromPs(pid);
  return started ? { pid, started } : undefined;
}

/** @param {ProcessIdentity | undefined} process */
export function isAlive(process) {
  return process !== undefined && identify(process.pid)?.started === process.started;
}

/** @param {number} pid */
function startedFromProc(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The second field is the name in brackets and may hold spaces; start time is field 22.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? undefined : fields[19];
  } catch {
    return undefined;
  }
}

/** @param {number} pid */
function startedFromPs(pid) {
  return spawnSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' }).stdout?.trim();
}

/** The command line of a running process, '' when there is none. @param {number} pid */
export function commandLine(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim();
  } catch {
    const asked = spawnSync('ps', ['-o', 'command=', '-p', String(pid)], { encoding: 'utf8' });
    return asked.stdout?.trim() ?? '';
  }
}

/**
 * @typedef {object} RunOptions
 * @property {boolean} [show] pass on what the program prints; it is collected either way
 * @property {boolean} [ignoreOutput] collect nothing: for a program that leaves another running
 * @property {NodeJS.ProcessEnv} [env]
 * @property {string} [cwd]
 * @property {number} [uid]
 * @property {number} [gid]
 */

/**
 * Runs a program to its end.
 * @param {string} command @param {string[]} args @param {RunOptions} [options]
 * @returns {Promise<{ code: number, output: string }>}
 */
export function run(command, args, { show, ignoreOutput, ...options } = {}) {
  return new Promise((resolve, reject) => {
    const out = ignoreOutput ? 'ignore' : 'pipe';
    const child = spawn(command, args, { cwd: root, ...options, stdio: ['ignore', out, out] });
    let output = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (text) => {
        output += text;
        if (show) process.stdout.write(text);
      });
    }
    child.on('error', reject);
    child.on('close', (code, signal) => {
      resolve({ code: code ?? 1, output: signal ? `${output}\nended by ${signal}\n` : output });
    });
  });
}

/**
 * As `run`, but a failure is thrown with what the program printed.
 * @param {string} doing what to call it in the message @param {Parameters<typeof run>} call
 */
export async function runOrThrow(doing, ...call) {
  const { code, output } = await run(...call);
  if (code === 0) return output;
  throw new RunError(`${doing} failed (exit code ${code}):\n${output.trim()}`);
}

/**
 * Asks a process to end and waits; after the time given it is ended without asking.
 * @param {ProcessIdentity} process @param {number} [patienceMs]
 */
export async function endProcess(process, patienceMs = 15_000) {
  signal(process, 'SIGTERM');
  const until = Date.now() + patienceMs;
  while (isAlive(process) && Date.now() < until) await sleep(50);
  signal(process, 'SIGKILL');
}

/** @param {ProcessIdentity} identity @param {NodeJS.Signals} name */
function signal(identity, name) {
  if (!isAlive(identity)) return;
  try {
    process.kill(identity.pid, name);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/** @param {number} ms */
export const sleep = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { stateSubfolder } from './paths.mjs';
import { endProcess, identify, isAlive } from './processes.mjs';

/**
 * @typedef {object} Running
 * @property {import('./processes.mjs').ProcessIdentity[]} processes the command, then its child
 * @property {string} url
 * @property {string} [build]
 */

/** The commands that stay. @typedef {'server' | 'dev'} Name */
export const NAMES = /** @type {const} */ (['server', 'dev']);

/** @param {Name} name */
const notePath = (name) => join(stateSubfolder('running'), `${name}.json`);

/**
 * Notes that this command and its child serve at an address; returns what removes the note.
 * @param {Name} name @param {{ childPid: number, url: string, build?: string }} what
 */
export function noteRunning(name, { childPid, url, build }) {
  const processes = [process.pid, childPid].map((pid) => identify(pid));
  writeFileSync(notePath(name), JSON.stringify({ processes, url, build }));
  return () => rmSync(notePath(name), { force: true });
}

/** What runs under a name, if any of its processes is there. @param {Name} name @returns {Running | undefined} */
export function findRunning(name) {
  try {
    const running = JSON.parse(readFileSync(notePath(name), 'utf8'));
    return running.processes.some(isAlive) ? running : undefined;
  } catch (error) {
    if (error.code === 'ENOENT') return undefined;
    throw error;
  }
}

/** @param {Name} name @returns {Promise<boolean>} whether there was something to end */
export async function endRunning(name) {
  const running = findRunning(name);
  for (const process of running?.processes ?? []) await endProcess(process);
  rmSync(notePath(name), { force: true });
  return running !== undefined;
}

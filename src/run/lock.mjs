import { linkSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import { stateSubfolder } from './paths.mjs';
import { identify, isAlive, sleep } from './processes.mjs';
import { say } from './say.mjs';

const POLL_MS = 100;
const WAITS_UNTOLD = 20;
const BREAKER_MAX_AGE_MS = 10_000;

/**
 * Runs `work` while no other process of this checkout holds the lock of that name. A lock whose
 * holder is gone is taken over. Not re-entrant.
 * @template T @param {string} name @param {() => Promise<T>} work
 * @param {{ folder?: string }} [options] @returns {Promise<T>}
 */
export async function withLock(name, work, { folder = stateSubfolder('locks') } = {}) {
  const path = join(folder, name);
  for (let waits = 0; !take(path); waits += 1) {
    const holder = read(path);
    if (holder && !isAlive(holder)) takeAway(path);
    else {
      if (holder && waits === WAITS_UNTOLD) {
        say(`Waiting for another Ellwise command (process ${holder.pid})`);
      }
      await sleep(POLL_MS);
    }
  }
  const release = () => rmSync(path, { force: true });
  process.once('exit', release);
  try {
    return await work();
  } finally {
    process.off('exit', release);
    release();
  }
}

/** A link appears whole or not at all, so nobody ever reads half a lock. @param {string} path */
function take(path) {
  const own = `${path}.${randomUUID()}`;
  writeFileSync(own, JSON.stringify(identify(process.pid)));
  try {
    linkSync(own, path);
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  } finally {
    rmSync(own, { force: true });
  }
}

/** @param {string} path @returns {import('./processes.mjs').ProcessIdentity | undefined} */
function read(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return undefined;
  }
}

/**
 * Removes the lock of a process that is gone. Two waiters must not do so at once: the second
 * would remove what the first has just taken.
 * @param {string} path
 */
function takeAway(path) {
  const breaker = `${path}.breaking`;
  if (!take(breaker)) {
    const age = Date.now() - (statSync(breaker, { throwIfNoEntry: false })?.mtimeMs ?? Date.now());
    if (age > BREAKER_MAX_AGE_MS) rmSync(breaker, { force: true });
    return;
  }
  const holder = read(path);
  if (holder && !isAlive(holder)) rmSync(path, { force: true });
  rmSync(breaker, { force: true });
}

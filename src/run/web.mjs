import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { root } from './paths.mjs';
import { LOOPBACK } from './ports.mjs';
import { sleep } from './processes.mjs';
import { RunError } from './say.mjs';

const START_PATIENCE_MS = 60_000;

/**
 * @typedef {object} Web
 * @property {string} url
 * @property {number} pid
 * @property {Promise<number>} ended its exit code
 * @property {() => Promise<number>} stop lets it finish what it is answering
 */

/**
 * Starts the built server and waits until it answers.
 * @param {{ build: string, port: number, origin?: string, env: NodeJS.ProcessEnv }} options
 * @returns {Promise<Web>}
 */
export async function startWeb({ build, port, origin, env }) {
  const url = `http://${LOOPBACK}:${port}`;
  const child = spawn(process.execPath, [join(root, 'src/server/entry.mjs')], {
    cwd: root,
    // The channel closes when this process ends in whatever way, and the server then ends too.
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    env: {
      ...process.env,
      NODE_ENV: 'production',
      ...env,
      ELLWISE_BUILD: build,
      PORT: String(port),
      ORIGIN: origin ?? url,
    },
  });
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => child.once('exit', (code) => resolve(code ?? 1)));
  const stop = () => {
    child.kill('SIGTERM');
    return ended;
  };
  const until = Date.now() + START_PATIENCE_MS;
  while (!(await isHealthy(url))) {
    if (child.exitCode !== null || child.signalCode !== null) {
      throw new RunError('The web server ended while starting.');
    }
    if (Date.now() > until) {
      await stop();
      throw new RunError(`The web server does not answer at ${url}.`);
    }
    await sleep(100);
  }
  return { url, pid: child.pid, ended, stop };
}

/** @param {string} url @param {string} [path] '/readyz' asks for the database as well */
export async function isHealthy(url, path = '/healthz') {
  try {
    const answer = await fetch(new URL(path, url), { signal: AbortSignal.timeout(5000) });
    return answer.ok && (await answer.text()) === 'ok';
  } catch {
    return false;
  }
}

import { chownSync, existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { LOOPBACK, isFree, nextFreePort } from './ports.mjs';
import { withLock } from './lock.mjs';
import { clusterPlace } from './postgresFolder.mjs';
import { postgresPrograms } from './postgresPrograms.mjs';
import { commandLine, identify, run, runOrThrow, sleep } from './processes.mjs';
import { newSecret, readOrMakeSecrets } from './secrets.mjs';
import { RunError, say } from './say.mjs';

/** @typedef {import('./postgresFolder.mjs').ClusterPlace} ClusterPlace */
/** @typedef {{ port: number, adminPassword: string, userPassword: string }} Cluster */

const FIRST_PORT = 54_320;
const START_TRIES = 3;
const START_PATIENCE_S = 60;
const LOG_LINES_SHOWN = 15;

/** The cluster's own administrator, and the account Ellwise uses: it may make databases, no more. */
export const CLUSTER_ADMIN = 'postgres';
export const CLUSTER_USER = 'ellwise';

/** Only what a program needs to find itself; PGDATA and the like of the caller would mislead it. */
const env = { PATH: process.env.PATH, LANG: 'C.UTF-8', LC_ALL: 'C.UTF-8' };

/**
 * Starts the private cluster, making it the first time; harmless when it runs.
 * @param {ClusterPlace} [given] @returns {Promise<Cluster>}
 */
export async function startCluster(given) {
  return withLock('postgres', async () => {
    const place = given ?? clusterPlace();
    const programs = await postgresPrograms(place.data);
    const passwords = readOrMakeSecrets(place.passwords, () => ({
      adminPassword: newSecret(),
      userPassword: newSecret(),
    }));
    if (!existsSync(place.data)) await makeCluster(place, programs, passwords.adminPassword);
    const found = runningPort(place);
    const answers = found !== undefined && (await becomesReady(place, programs, found));
    const port = answers ? found : await launch(place, programs);
    if (!answers && !(await becomesReady(place, programs, port))) {
      throw new RunError(`PostgreSQL ended at once:\n${logTail(place)}`);
    }
    return { port, ...passwords };
  });
}

/** Stops the private cluster; true when it was running. @param {ClusterPlace} [given] */
export async function stopCluster(given) {
  return withLock('postgres', async () => {
    const place = given ?? clusterPlace();
    if (runningPort(place) === undefined) return false;
    const programs = await postgresPrograms(place.data);
    const args = ['-D', place.data, '-m', 'fast', '-w', '-t', String(START_PATIENCE_S), 'stop'];
    await runOrThrow('Stopping PostgreSQL', join(programs, 'pg_ctl'), args, asOwner(place));
    return true;
  });
}

/** @param {ClusterPlace} place */
const asOwner = (place) => ({ ...place.owner, cwd: place.folder, env });

/** @param {ClusterPlace} place @param {string} programs @param {string} adminPassword */
async function makeCluster(place, programs, adminPassword) {
  say('Making a private PostgreSQL cluster');
  const { uid, gid } = place.owner;
  const passwordFile = join(place.folder, 'initdb-password');
  // A cluster appears whole or not at all, should this be interrupted.
  const unfinished = join(place.folder, 'data.unfinished');
  rmSync(unfinished, { recursive: true, force: true });
  writeFileSync(passwordFile, adminPassword, { mode: 0o600 });
  if (uid !== undefined && gid !== undefined) chownSync(passwordFile, uid, gid);
  const args = [
    ...['-D', unfinished, '-U', CLUSTER_ADMIN, '-A', 'scram-sha-256', '--pwfile', passwordFile],
    ...['-E', 'UTF8', '--locale', 'C.UTF-8'],
  ];
  try {
    await runOrThrow('initdb', join(programs, 'initdb'), args, asOwner(place));
  } finally {
    rmSync(passwordFile, { force: true });
  }
  renameSync(unfinished, place.data);
}

/**
 * The port of the running cluster. A pid file whose number now belongs to another program is
 * removed, since pg_ctl would take that program for the server; one whose process is gone is left
 * to PostgreSQL, which also looks for orphans still using the data.
 * @param {ClusterPlace} place
 */
function runningPort(place) {
  const pidFile = join(place.data, 'postmaster.pid');
  if (!existsSync(pidFile)) return undefined;
  const lines = readFileSync(pidFile, 'utf8').split('\n');
  const [pid, port] = [Number(lines[0]), Number(lines[3])];
  if (!identify(pid)) return undefined;
  if (isOurServer(pid, place)) return port || undefined;
  rmSync(pidFile);
  return undefined;
}

/** @param {number} pid @param {ClusterPlace} place */
function isOurServer(pid, place) {
  const words = commandLine(pid);
  return /\bpostgres(\s|$)/.test(words) && words.includes(`-D ${place.data} `);
}

/** Starts the server on the port it had last, or else on the next free one. */
async function launch(place, programs) {
  const portFile = join(place.folder, 'port');
  let from = existsSync(portFile) ? Number(readFileSync(portFile, 'utf8')) : FIRST_PORT;
  for (let attempt = 1; ; attempt += 1) {
    const port = await nextFreePort(from);
    const settings = `-p ${port} -c listen_addresses=${LOOPBACK} -c unix_socket_directories=`;
    const { code } = await run(
      join(programs, 'pg_ctl'),
      [
        ...['-D', place.data, '-l', place.log, '-o', settings],
        ...['-w', '-t', String(START_PATIENCE_S), 'start'],
      ],
      { ...asOwner(place), ignoreOutput: true },
    );
    if (code === 0) {
      writeFileSync(portFile, String(port));
      return port;
    }
    if (attempt === START_TRIES) throw new RunError(`PostgreSQL did not start:\n${logTail(place)}`);
    // Taken since it was looked at, or orphans of a killed server still hold the data.
    if (!(await isFree(port))) from = port + 1;
    await sleep(1000);
  }
}

/**
 * True once the server answers: one just started may be recovering from a crash. False when its
 * process goes instead: one that was being killed when it was found looks alive for a moment.
 */
async function becomesReady(place, programs, port) {
  const args = ['-h', LOOPBACK, '-p', String(port), '-q', '-t', '2'];
  const until = Date.now() + START_PATIENCE_S * 1000;
  while ((await run(join(programs, 'pg_isready'), args, asOwner(place))).code !== 0) {
    if (runningPort(place) === undefined) return false;
    if (Date.now() > until) throw new RunError(`PostgreSQL does not answer:\n${logTail(place)}`);
    await sleep(200);
  }
  return true;
}

/** @param {ClusterPlace} place */
function logTail(place) {
  if (!existsSync(place.log)) return '';
  return readFileSync(place.log, 'utf8').trim().split('\n').slice(-LOG_LINES_SHOWN).join('\n');
}

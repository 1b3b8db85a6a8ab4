import { readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { createDatabase, databaseUrl, databasesLike, withClient } from './databases.mjs';
import { withLock } from './lock.mjs';
import { stateSubfolder } from './paths.mjs';
import { LOOPBACK } from './ports.mjs';
import { CLUSTER_ADMIN, CLUSTER_USER, startCluster, stopCluster } from './postgres.mjs';
import { identify, isAlive } from './processes.mjs';

/**
 * @typedef {object} DatabaseServer
 * @property {string} url Ellwise's own database on it
 * @property {boolean} isPrivate false when DATABASE_URL named it
 * @property {() => Promise<void>} close lets go of it; the last command to do so stops the cluster
 */

const DATABASE = 'ellwise';

/** The server that DATABASE_URL names, else the private cluster, started. @returns {Promise<DatabaseServer>} */
export async function openDatabaseServer() {
  const { DATABASE_URL: url } = process.env;
  if (url) return { url, isPrivate: false, close: async () => undefined };
  const cluster = await withLock('database-users', async () => {
    writeFileSync(usePath(process.pid), JSON.stringify(identify(process.pid)));
    return startCluster();
  });
  const at = (user, password) =>
    `postgres://${user}:${password}@${LOOPBACK}:${cluster.port}/${CLUSTER_ADMIN}`;
  await ensureUser(at(CLUSTER_ADMIN, cluster.adminPassword), cluster.userPassword);
  const serverUrl = at(CLUSTER_USER, cluster.userPassword);
  await withLock('databases', async () => {
    const [found] = await databasesLike(serverUrl, DATABASE);
    if (!found) await createDatabase(serverUrl, DATABASE);
  });
  return { url: databaseUrl(serverUrl, DATABASE), isPrivate: true, close: leave };
}

/** @param {number} pid */
const usePath = (pid) => join(stateSubfolder('database-users'), String(pid));

/** A command that was killed left its note behind, so each note is checked. */
function leave() {
  return withLock('database-users', async () => {
    rmSync(usePath(process.pid), { force: true });
    for (const name of readdirSync(stateSubfolder('database-users'))) {
      if (isAlive(JSON.parse(readFileSync(usePath(Number(name)), 'utf8')))) return;
      rmSync(usePath(Number(name)), { force: true });
    }
    await stopCluster();
  });
}

/** @param {string} adminUrl @param {string} password */
function ensureUser(adminUrl, password) {
  return withClient(adminUrl, async (client) => {
    const role = client.escapeIdentifier(CLUSTER_USER);
    const found = await client.query('select from pg_roles where rolname = $1', [CLUSTER_USER]);
    if (found.rowCount === 1) return;
    await client.query(
      `create role ${role} login createdb password ${client.escapeLiteral(password)}`,
    );
  });
}

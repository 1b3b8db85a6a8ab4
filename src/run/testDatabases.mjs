import { createHash } from 'node:crypto';
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import {
  createDatabase,
  databaseUrl,
  databasesLike,
  dropDatabase,
  renameDatabase,
  withClient,
} from './databases.mjs';
import { withLock } from './lock.mjs';
import { root } from './paths.mjs';
import { identify } from './processes.mjs';
import { runTypeScript } from './scripts.mjs';

const TEMPLATE = 'ellwise_template_';
const COPY = 'ellwise_test_';

/** @param {string} url @param {string[]} steps of db/migrate.ts */
export const migrate = (url, ...steps) =>
  runTypeScript('db/migrate.ts', { args: steps, env: { DATABASE_URL: url } });

/**
 * A migrated, empty database to copy. It is kept from run to run until the migrations change.
 * @param {string} serverUrl @returns {Promise<string>} its name
 */
export function ensureTemplate(serverUrl) {
  return withLock('template-database', async () => {
    const name = `${TEMPLATE}${hashMigrations()}`;
    const existing = await databasesLike(serverUrl, `${TEMPLATE}%`);
    if (existing.includes(name)) return name;
    for (const old of existing) await dropDatabase(serverUrl, old);
    const unfinished = `${TEMPLATE}unfinished`;
    await createDatabase(serverUrl, unfinished);
    await migrate(databaseUrl(serverUrl, unfinished), 'up');
    await renameDatabase(serverUrl, unfinished, name);
    return name;
  });
}

/**
 * A database of this run alone, dropped by the next run should this one be killed.
 * @param {string} serverUrl @param {string} use @param {{ template?: string }} [options]
 */
export async function makeTestDatabase(serverUrl, use, { template } = {}) {
  const name = `${COPY}${process.pid}_${use}`;
  await dropDatabase(serverUrl, name);
  // Copying fails while another run copies or makes the template.
  await withLock('template-database', () => createDatabase(serverUrl, name, { template }));
  await withClient(serverUrl, (client) =>
    client.query(`alter database ${client.escapeIdentifier(name)} set synchronous_commit = off`),
  );
  return {
    url: databaseUrl(serverUrl, name),
    drop: () => dropDatabase(serverUrl, name),
  };
}

/** Drops what killed runs left behind. @param {string} serverUrl */
export async function dropAbandoned(serverUrl) {
  for (const name of await databasesLike(serverUrl, `${COPY}%`)) {
    const pid = Number(name.slice(COPY.length).split('_')[0]);
    if (pid && !identify(pid)) await dropDatabase(serverUrl, name);
  }
}

function hashMigrations() {
  const folder = join(root, 'db/migrations');
  const hash = createHash('sha256');
  for (const name of readdirSync(folder).sort()) {
    hash.update(name).update(readFileSync(join(folder, name)));
  }
  return hash.digest('hex').slice(0, 16);
}

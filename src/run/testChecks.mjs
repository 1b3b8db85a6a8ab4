import { ensureBuild } from './build.mjs';
import { withClient } from './databases.mjs';
import { statePath } from './paths.mjs';
import { RunError } from './say.mjs';
import { runTool } from './scripts.mjs';
import { makeTestDatabase, migrate } from './testDatabases.mjs';

/** @typedef {{ passed: number, failed: number, skipped?: number, output?: string }} Counts */
/** @typedef {import('./resources.mjs').Resources} Resources */
/** @typedef {import('./databaseServer.mjs').DatabaseServer} DatabaseServer */

/** @type {Counts} */
const PASSED = { passed: 1, failed: 0 };

/** Steps that count as one test each. @type {Record<string, (resources: Resources, server: DatabaseServer) => Promise<Counts>>} */
export const checks = {
  migrations: checkMigrations,
  lint: () => runCheck('eslint/bin/eslint.js', '--config', '.eslint.config.js', '.'),
  format: () =>
    runCheck(
      'prettier/bin/prettier.cjs',
      ...['--check', '--log-level', 'warn', '--cache', '--cache-strategy', 'content'],
      ...['--cache-location', statePath('test', 'prettier'), '.'],
    ),
  unused: () => runCheck('knip/bin/knip.js', '--config', '.knip.json'),
  check: () => runCheck('astro/astro.js', 'check'),
  async build() {
    await ensureBuild();
    return PASSED;
  },
};

/** @param {string} script @param {string[]} args @returns {Promise<Counts>} */
async function runCheck(script, ...args) {
  const { code, output } = await runTool(script, { args });
  return code === 0 ? PASSED : { passed: 0, failed: 1, output };
}

/** Up, down and up again; going down leaves nothing but the record of migrations. */
async function checkMigrations(resources, server) {
  const database = await makeTestDatabase(server.url, 'migrations');
  resources.add(database.drop);
  await migrate(database.url, 'up');
  await migrate(database.url, 'down');
  const left = await withClient(database.url, (client) =>
    client.query(`select relname from pg_class where relnamespace = 'public'::regnamespace
      and relkind in ('r', 'v', 'S') and relname <> 'schema_migrations'`),
  );
  if (left.rowCount > 0) {
    const names = left.rows.map(({ relname }) => relname).join(', ');
    throw new RunError(`Migrating down leaves behind: ${names}`);
  }
  await migrate(database.url, 'up');
  return PASSED;
}

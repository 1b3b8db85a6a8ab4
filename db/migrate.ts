import { basename, join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { QueryInterface } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { connect } from './connection.ts';

/** `tsx db/migrate.ts [up|down|pending]…` runs the given steps in order; without one, `up`. */

interface Migration {
  up(params: { context: QueryInterface }): Promise<unknown>;
  down(params: { context: QueryInterface }): Promise<unknown>;
}

/** Any fixed number: two servers starting on one database migrate one after the other. */
const MIGRATION_LOCK = 4_703_311;

// One connection waits holding the lock, one records, one migrates.
const sequelize = connect({ statementTimeoutMs: 0, poolMax: 3 });

const umzug = new Umzug({
  migrations: {
    glob: ['*.ts', { cwd: join(import.meta.dirname, 'migrations') }],
    resolve({ name, path, context }) {
      const load = async (): Promise<Migration> => import(pathToFileURL(path!).href);
      return {
        name: basename(name, '.ts'),
        up: async () => (await load()).up({ context }),
        down: async () => (await load()).down({ context }),
      };
    },
  },
  context: sequelize.getQueryInterface(),
  storage: new SequelizeStorage({ sequelize, tableName: 'schema_migrations' }),
  logger: {
    info: (event) => {
      if (event.event === 'migrated') console.log(`migrated ${event.name}`);
      if (event.event === 'reverted') console.log(`reverted ${event.name}`);
    },
    warn: console.warn,
    error: console.error,
    debug: () => undefined,
  },
});

const steps: Record<string, () => Promise<unknown>> = {
  up: () => umzug.up(),
  down: () => umzug.down({ to: 0 }),
  pending: async () => (await umzug.pending()).forEach(({ name }) => console.log(name)),
};

const asked = process.argv.length > 2 ? process.argv.slice(2) : ['up'];
const unknown = asked.find((name) => !(name in steps));
if (unknown) throw new Error(`"${unknown}" is not one of: ${Object.keys(steps).join(', ')}`);

try {
  await sequelize.transaction(async (transaction) => {
    await sequelize.query(`select pg_advisory_xact_lock(${MIGRATION_LOCK})`, { transaction });
    for (const name of asked) await steps[name]!();
  });
} finally {
  await sequelize.close();
}

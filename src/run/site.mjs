import { rmSync } from 'node:fs';
import { ensureBuild } from './build.mjs';
import { openDatabaseServer } from './databaseServer.mjs';
import { startMailSink } from './mailSink.mjs';
import { checkNode, ensurePackages } from './packages.mjs';
import { stateSubfolder } from './paths.mjs';
import { isFree, nextFreePort } from './ports.mjs';
import { authSecret, newSecret } from './secrets.mjs';
import { RunError } from './say.mjs';
import { runTypeScript } from './scripts.mjs';
import { dropAbandoned, ensureTemplate, makeTestDatabase, migrate } from './testDatabases.mjs';
import { startWeb } from './web.mjs';

/** @typedef {import('./resources.mjs').Resources} Resources */
/** @typedef {import('./databaseServer.mjs').DatabaseServer} DatabaseServer */

const FIRST_PORT = 4321;
const FIRST_TEST_PORT = 4400;

/** What every command begins with: Node, packages and a database server. @param {Resources} resources */
export async function openServices(resources) {
  checkNode();
  await ensurePackages();
  const database = await openDatabaseServer();
  resources.add(database.close);
  return database;
}

/**
 * Brings the tables up to date. Demo accounts have known passwords, so a database that somebody
 * else provides gets them only from `npm run db:seed`.
 * @param {DatabaseServer} database
 */
export async function loadDatabase({ url, isPrivate }) {
  await migrate(url, 'up');
  if (isPrivate) await loadDemo(url);
}

/** @param {string} url */
const loadDemo = (url) => runTypeScript('db/seeders/demo.ts', { env: { DATABASE_URL: url } });

/** PORT, which has to be free, else the next free one from 4321. */
export async function choosePort() {
  const { PORT } = process.env;
  if (!PORT) return nextFreePort(FIRST_PORT);
  if (await isFree(Number(PORT))) return Number(PORT);
  throw new RunError(`Port ${PORT} is taken: set PORT to another one, or leave it unset.`);
}

/**
 * Where letters go: to SMTP_URL, else to a local server whose letters a development page shows.
 * @param {Resources} resources
 */
export async function openMail(resources) {
  if (process.env.SMTP_URL) return { ELLWISE_DEV_MAIL: '' };
  return openMailSink(resources, stateSubfolder('mail'));
}

/** @param {Resources} resources @param {string} folder */
async function openMailSink(resources, folder) {
  const sink = await startMailSink(folder);
  resources.add(sink.close);
  return { SMTP_URL: sink.url, ELLWISE_DEV_MAIL: '1', ELLWISE_MAIL_FOLDER: folder };
}

/** The secret that sessions are signed with. */
export const sessionEnvironment = () => ({ AUTH_SECRET: authSecret() });

/**
 * A built site with a database, mail and secret of its own, for a run of tests or benchmarks.
 * @param {Resources} resources @param {DatabaseServer} server @param {string} use
 */
export async function openDisposableSite(resources, server, use) {
  if (server.isPrivate) await dropAbandoned(server.url);
  const build = await ensureBuild();
  const template = await ensureTemplate(server.url);
  const database = await makeTestDatabase(server.url, use, { template });
  resources.add(database.drop);
  await loadDemo(database.url);
  const letters = stateSubfolder('test', `${use}-mail`);
  rmSync(letters, { recursive: true });
  const env = {
    DATABASE_URL: database.url,
    AUTH_SECRET: newSecret(),
    RATE_LIMITS: 'off',
    ...(await openMailSink(resources, letters)),
  };
  const web = await startWeb({ build, port: await nextFreePort(FIRST_TEST_PORT), env });
  resources.add(web.stop);
  return { url: web.url, build, env };
}

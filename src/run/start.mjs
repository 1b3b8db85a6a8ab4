import { basename } from 'node:path';
import { isLoopback, readSettings } from '../server/entry/settings.mjs';
import { ensureBuild, hashSources } from './build.mjs';
import { withLock } from './lock.mjs';
import { openResources } from './resources.mjs';
import { endRunning, findRunning, noteRunning } from './running.mjs';
import { RunError, runMain, say } from './say.mjs';
import { choosePort, loadDatabase, openMail, openServices, sessionEnvironment } from './site.mjs';
import { isHealthy, startWeb } from './web.mjs';

/** `npm start`: everything that is missing, then the built site until it is told to end. */
async function start() {
  const resources = openResources({ interruptedCode: 0 });
  try {
    refusePublicWithoutMail();
    const web = await withLock('start', () => launch(resources));
    if (!web) return 0;
    const code = await web.ended;
    if (resources.isClosing()) return 0;
    say(`The web server ended by itself (exit code ${code}).`);
    return 1;
  } finally {
    await resources.close();
  }
}

/** Letters caught here hold links that open accounts; they are for this machine's own user. */
function refusePublicWithoutMail() {
  const { ORIGIN, SMTP_URL } = process.env;
  if (!ORIGIN || SMTP_URL || isLoopback(readSettings(process.env).origin)) return;
  throw new RunError(`ORIGIN is ${ORIGIN}, so letters are real: set SMTP_URL to a mail server.`);
}

/** @param {import('./resources.mjs').Resources} resources */
async function launch(resources) {
  const database = await openServices(resources);
  if (await isAlreadyRunning()) return undefined;

  const [build] = await Promise.all([ensureBuild(), loadDatabase(database)]);
  const mail = await openMail(resources);
  const web = await startWeb({
    build,
    port: await choosePort(),
    origin: process.env.ORIGIN,
    env: { DATABASE_URL: database.url, ...sessionEnvironment(), ...mail },
  });
  resources.add(web.stop);
  const { url } = web;
  resources.add(noteRunning('server', { childPid: web.pid, url, build: basename(build) }));
  say(`\nEllwise is at ${process.env.ORIGIN ?? url}   (Ctrl+C or npm stop ends it)\n`);
  return web;
}

/** One that is there but does not answer, or lost its database, is ended and replaced. */
async function isAlreadyRunning() {
  const running = findRunning('server');
  if (!running) return false;
  if (await isHealthy(running.url, '/readyz')) {
    say(`\nEllwise is already running at ${running.url}`);
    if (running.build !== hashSources()) {
      say('The sources have changed since: npm stop, then npm start, shows them.');
    }
    return true;
  }
  say('Ending a server that does not answer');
  await endRunning('server');
  return false;
}

await runMain(start);

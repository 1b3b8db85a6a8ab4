/**
 * The production server: Astro's handler behind limits and headers of our own, on loopback.
 * Set DATABASE_URL and AUTH_SECRET; PORT, ORIGIN, TRUST_PROXY and SMTP_URL as needed.
 */
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import pg from 'pg';
import { createServer } from './entry/createServer.mjs';
import { readSettings } from './entry/settings.mjs';

process.env.NODE_ENV ??= 'production';
process.env.ASTRO_NODE_AUTOSTART = 'disabled';

const settings = readSettings(process.env);
const { handler } = await import(pathToFileURL(join(settings.build, 'server/entry.mjs')).href);

const PING_TIMEOUT_MS = 2_000;
const pings = new pg.Pool({
  connectionString: process.env.DATABASE_URL,
  max: 1,
  connectionTimeoutMillis: PING_TIMEOUT_MS,
  query_timeout: PING_TIMEOUT_MS,
});
// The pool drops a connection that breaks while idle; the next ping tells.
pings.on('error', () => undefined);

const { server, drain } = createServer({
  handler,
  settings,
  pingDatabase: () => pings.query('select 1'),
});

let ending = false;
const end = async () => {
  if (ending) return;
  ending = true;
  await drain();
  process.exit(0);
};
process.on('SIGTERM', end);
process.on('SIGINT', end);
// Started by one of our commands, it does not outlive that command.
process.on('disconnect', end);

server.listen(settings.port, '127.0.0.1', () => {
  if (!process.connected) console.log(`Ellwise is at ${settings.origin.origin}`);
});

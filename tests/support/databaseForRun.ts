import type { TestProject } from 'vitest/node';
import { openDatabaseServer } from '../../src/run/databaseServer.mjs';
import { dropAbandoned, ensureTemplate, makeTestDatabase } from '../../src/run/testDatabases.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** The database of each worker, by its number less one. */
    databaseUrls: string[];
  }
}

/** One migrated database for each worker, so that workers do not disturb each other. */
export default async function setup({ vitest, provide }: TestProject) {
  const server = await openDatabaseServer();
  if (server.isPrivate) await dropAbandoned(server.url);
  const template = await ensureTemplate(server.url);
  const databases: { url: string; drop(): Promise<void> }[] = [];
  for (let worker = 1; worker <= vitest.config.maxWorkers; worker += 1) {
    databases.push(await makeTestDatabase(server.url, `worker${worker}`, { template }));
  }
  provide(
    'databaseUrls',
    databases.map(({ url }) => url),
  );
  return async () => {
    for (const { drop } of databases) await drop();
    await server.close();
  };
}

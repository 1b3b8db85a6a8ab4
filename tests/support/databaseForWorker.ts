import { afterAll, beforeAll, inject } from 'vitest';

process.env.DATABASE_URL = inject('databaseUrls')[Number(process.env.VITEST_POOL_ID) - 1];
// A query that forgets its transaction then hangs at once instead of under load.
process.env.DATABASE_POOL_MAX = '2';

beforeAll(async () => {
  // Imported only now: db/connection.ts reads the variables above.
  const { emptyDatabase } = await import('./database.ts');
  await emptyDatabase();
});

afterAll(async () => {
  await globalThis.ellwiseSequelize?.close();
  globalThis.ellwiseSequelize = undefined;
});

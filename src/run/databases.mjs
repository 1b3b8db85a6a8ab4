/** Whole databases on a server, each named by an address with another path. */

/**
 * Runs `work` on one connection. pg is loaded late: the packages may have been installed just now.
 * @template T @param {string} url @param {(client: import('pg').Client) => Promise<T>} work
 */
export async function withClient(url, work) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: url, connectionTimeoutMillis: 10_000 });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** @param {string} serverUrl @param {string} name */
export function databaseUrl(serverUrl, name) {
  const url = new URL(serverUrl);
  url.pathname = `/${name}`;
  return url.href;
}

/** @param {string} serverUrl @param {string} pattern of SQL's like @returns {Promise<string[]>} */
export function databasesLike(serverUrl, pattern) {
  return withClient(serverUrl, async (client) => {
    const sql = 'select datname from pg_database where datname like $1 order by datname';
    return (await client.query(sql, [pattern])).rows.map(({ datname }) => datname);
  });
}

/** @param {string} serverUrl @param {string} name @param {{ template?: string }} [options] */
export function createDatabase(serverUrl, name, { template } = {}) {
  return withClient(serverUrl, async (client) => {
    const copying = template ? ` template ${client.escapeIdentifier(template)}` : '';
    await client.query(`create database ${client.escapeIdentifier(name)}${copying}`);
  });
}

/** Drops a database, whoever is connected to it. @param {string} serverUrl @param {string} name */
export function dropDatabase(serverUrl, name) {
  return withClient(serverUrl, async (client) => {
    await client.query(`drop database if exists ${client.escapeIdentifier(name)} with (force)`);
  });
}

/** @param {string} serverUrl @param {string} from @param {string} to */
export function renameDatabase(serverUrl, from, to) {
  return withClient(serverUrl, async (client) => {
    const [old, name] = [from, to].map((word) => client.escapeIdentifier(word));
    await client.query(`alter database ${old} rename to ${name}`);
  });
}

import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, readdirSync, realpathSync } from 'node:fs';
import { delimiter, dirname, join } from 'node:path';
import { installDebianPackage } from './apt.mjs';
import { RunError } from './say.mjs';

const DEBIAN_VERSIONS = '/usr/lib/postgresql';
const PROGRAMS = ['initdb', 'pg_ctl', 'postgres', 'pg_isready'];

/**
 * The folder of PostgreSQL's server programs, of the version that made `data` if it exists.
 * @param {string} data @returns {Promise<string>}
 */
export async function postgresPrograms(data) {
  const version = existsSync(join(data, 'PG_VERSION'))
    ? readFileSync(join(data, 'PG_VERSION'), 'utf8').trim()
    : undefined;
  const found = find(version);
  if (found) return found;
  if (version && find(undefined)) {
    throw new RunError(
      `The data in ${data} was made by PostgreSQL ${version}, which is no longer installed.\n` +
        `Install that version again, or remove ${dirname(data)} to begin afresh.`,
    );
  }
  await installDebianPackage(
    'postgresql',
    'put the programs of PostgreSQL 14 or later on PATH, or set DATABASE_URL to a running server.',
  );
  const installed = find(version);
  if (installed) return installed;
  throw new RunError('PostgreSQL was installed, but its initdb was not found.');
}

/** @param {string | undefined} version */
function find(version) {
  const debian = existsSync(DEBIAN_VERSIONS) ? readdirSync(DEBIAN_VERSIONS) : [];
  const newestFirst = debian.sort((a, b) => Number(b) - Number(a));
  const folders = [
    ...newestFirst.map((name) => join(DEBIAN_VERSIONS, name, 'bin')),
    ...(process.env.PATH ?? '').split(delimiter).flatMap((folder) => {
      const initdb = join(folder, 'initdb');
      return existsSync(initdb) ? [dirname(realpathSync(initdb))] : [];
    }),
  ];
  return folders.find(
    (folder) =>
      PROGRAMS.every((name) => existsSync(join(folder, name))) &&
      (version === undefined || versionOf(folder) === version),
  );
}

/** The major version of the programs in a folder. @param {string} folder */
function versionOf(folder) {
  const { stdout } = spawnSync(join(folder, 'postgres'), ['-V'], { encoding: 'utf8' });
  return / (\d+)\./.exec(stdout)?.[1];
}

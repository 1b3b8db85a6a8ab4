import { randomBytes } from 'node:crypto';
import { linkSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { statePath } from './paths.mjs';

const SECRET_BYTES = 32;

/** A secret safe in an address, in SQL and in a shell word. */
export const newSecret = () => randomBytes(SECRET_BYTES).toString('hex');

/**
 * What a file readable by its owner alone holds; `make` fills it the first time.
 * @template T @param {string} path @param {() => T} make @returns {T}
 */
export function readOrMakeSecrets(path, make) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch (error) {
    if (error.code !== 'ENOENT') throw error;
  }
  const own = `${path}.${process.pid}`;
  writeFileSync(own, JSON.stringify(make()), { mode: 0o600 });
  try {
    linkSync(own, path);
  } catch (error) {
    if (error.code !== 'EEXIST') throw error;
  } finally {
    rmSync(own, { force: true });
  }
  return JSON.parse(readFileSync(path, 'utf8'));
}

/** Signs sessions and tokens: AUTH_SECRET, else one made on the first start. */
export function authSecret() {
  if (process.env.AUTH_SECRET) return process.env.AUTH_SECRET;
  return readOrMakeSecrets(statePath('secrets.json'), () => ({ authSecret: newSecret() }))
    .authSecret;
}

import { createHash } from 'node:crypto';
import { chmodSync, chownSync, existsSync, lstatSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { canEnter, unprivilegedAccount } from './account.mjs';
import { stateFolder } from './paths.mjs';
import { RunError } from './say.mjs';

/**
 * @typedef {object} ClusterPlace
 * @property {string} folder private to the account
 * @property {string} data
 * @property {string} log
 * @property {string} passwords
 * @property {{ uid?: number, gid?: number }} owner given to spawn; empty when it is ourselves
 */

/**
 * Where the private cluster lives, and as whom: in the state folder, or under /var/tmp when the
 * account that runs it cannot enter that (in a checkout under /root, say).
 * @param {string} [state] @returns {ClusterPlace}
 */
export function clusterPlace(state = stateFolder) {
  const account = unprivilegedAccount();
  mkdirSync(state, { recursive: true });
  const isOutside = account !== undefined && !canEnter(account, state);
  const name = createHash('sha256').update(state).digest('hex').slice(0, 16);
  const folder = isOutside ? `/var/tmp/ellwise-${name}` : join(state, 'postgres');
  return {
    folder,
    data: join(folder, 'data'),
    log: join(folder, 'server.log'),
    passwords: join(folder, 'passwords.json'),
    owner: ownFolder(folder, account, isOutside),
  };
}

/**
 * Makes the folder private, or takes the owner it already has: a cluster made by a user stays that
 * user's when root starts it. Not so under /var/tmp, where anybody could have made the folder.
 * @param {string} folder @param {import('./account.mjs').Account | undefined} account
 * @param {boolean} isOutside
 */
function ownFolder(folder, account, isOutside) {
  if (!existsSync(folder)) {
    mkdirSync(folder, { mode: 0o700 });
    if (account) chownSync(folder, account.uid, account.gid);
  }
  const found = lstatSync(folder);
  const wanted = account ? account.uid : process.getuid?.();
  const allowed = found.uid === wanted || (account && !isOutside && found.uid !== 0);
  if (!found.isDirectory() || !allowed) {
    throw new RunError(`${folder} belongs to another account; remove it to begin afresh.`);
  }
  chmodSync(folder, 0o700);
  return account ? { uid: found.uid, gid: found.gid } : {};
}

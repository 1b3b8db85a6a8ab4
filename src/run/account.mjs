import { spawnSync } from 'node:child_process';

/** @typedef {{ name: string, uid: number, gid: number }} Account */

const ACCOUNTS = ['postgres', 'nobody'];

/**
 * The account PostgreSQL runs as, since it refuses to run as root; undefined: whoever we are.
 * @returns {Account | undefined}
 */
export function unprivilegedAccount() {
  if (process.getuid?.() !== 0) return undefined;
  for (const name of ACCOUNTS) {
    const [uid, gid] = ['-u', '-g'].map((flag) => {
      const asked = spawnSync('id', [flag, name], { encoding: 'utf8' });
      return asked.status === 0 ? Number(asked.stdout) : undefined;
    });
    if (uid && gid) return { name, uid, gid };
  }
  throw new Error(`None of these accounts exists: ${ACCOUNTS.join(', ')}`);
}

/** Whether an account can work in a folder. @param {Account} account @param {string} folder */
export function canEnter({ uid, gid }, folder) {
  const asked = spawnSync('/bin/sh', ['-c', 'cd "$1"', 'sh', folder], { uid, gid, cwd: '/' });
  return asked.status === 0;
}

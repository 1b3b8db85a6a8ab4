import { existsSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { run } from './processes.mjs';
import { RunError, say } from './say.mjs';

const OTHER_APT_PATIENCE_S = 300;

/**
 * Installs a Debian package, as root or through a sudo that asks nothing; otherwise says what to run.
 * @param {string} name @param {string} otherWay what to do where there is no apt-get
 */
export async function installDebianPackage(name, otherWay) {
  if (!existsSync('/usr/bin/apt-get')) {
    throw new RunError(`${name} is missing and this system has no apt-get: ${otherWay}`);
  }
  const prefix = elevation();
  if (!prefix) {
    throw new RunError(
      `${name} is missing. Run this once, then the same command again:\n\n` +
        `    sudo apt-get update && sudo apt-get install --yes --no-install-recommends ${name}\n\n` +
        `or: ${otherWay}`,
    );
  }
  say(`Installing Debian's ${name}`);
  const apt = async (...args) => {
    const options = ['-q', '-o', `DPkg::Lock::Timeout=${OTHER_APT_PATIENCE_S}`];
    const [command, ...words] = [...prefix, 'env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get'];
    return run(command, [...words, ...options, ...args]);
  };
  const updated = await apt('update');
  const installed = await apt('install', '--yes', '--no-install-recommends', name);
  if (installed.code !== 0) {
    const said = [updated, installed].filter(({ code }) => code !== 0).map(({ output }) => output);
    throw new RunError(`Installing ${name} failed; ${otherWay}\n\n${said.join('\n').trim()}`);
  }
}

/** The words before apt-get that make it work here, or undefined. */
function elevation() {
  if (process.getuid?.() === 0) return [];
  const sudo = spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' });
  return sudo.status === 0 ? ['sudo', '-n'] : undefined;
}

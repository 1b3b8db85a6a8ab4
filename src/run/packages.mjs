import { accessSync, constants, existsSync, readFileSync } from 'node:fs';
import { homedir } from 'node:os';
import { join } from 'node:path';
import { isDeepStrictEqual } from 'node:util';
import { withLock } from './lock.mjs';
import { root, stateSubfolder } from './paths.mjs';
import { runOrThrow } from './processes.mjs';
import { RunError, say } from './say.mjs';

/** @param {string} path */
const readJson = (path) => JSON.parse(readFileSync(path, 'utf8'));

/** Refuses a Node outside package.json's range, which reads ">=20.19 <23". */
export function checkNode() {
  const { node } = readJson(join(root, 'package.json')).engines;
  const [, major, minor, below] = /^>=(\d+)\.(\d+) <(\d+)$/.exec(node);
  const [hasMajor, hasMinor] = process.versions.node.split('.').map(Number);
  const isNewEnough = hasMajor > +major || (hasMajor === +major && hasMinor >= +minor);
  if (isNewEnough && hasMajor < +below) return;
  throw new RunError(`Ellwise needs Node.js ${node}; this is ${process.versions.node}.`);
}

/** Installs the npm packages of package-lock.json unless node_modules holds just those. */
export const ensurePackages = () => withLock('packages', installIfChanged);

async function installIfChanged() {
  const manifest = readJson(join(root, 'package.json'));
  const lock = readJson(join(root, 'package-lock.json')).packages;
  const isLockCurrent = ['dependencies', 'devDependencies'].every((kind) =>
    isDeepStrictEqual(manifest[kind], lock[''][kind]),
  );
  if (isLockCurrent && isInstalled(lock)) return;
  const command = isLockCurrent ? 'ci' : 'install';
  say(`Installing npm packages (npm ${command})`);
  // Building and the local mail server need the development packages, whatever NODE_ENV says.
  await npm(command, '--include=dev', '--no-audit', '--no-fund');
}

/** npm writes what it installed into node_modules, last of all. @param {Record<string, any>} lock */
function isInstalled(lock) {
  const record = join(root, 'node_modules/.package-lock.json');
  if (!existsSync(record)) return false;
  const installed = readJson(record).packages;
  return Object.entries(lock).every(([path, { version, optional, devOptional, link }]) => {
    if (path === '' || link) return true;
    const has = installed[path];
    return has ? has.version === version : Boolean(optional || devOptional);
  });
}

/** @param {string[]} args */
function npm(...args) {
  const { npm_execpath: script } = process.env;
  const [command, ...words] = script ? [process.execPath, script] : ['npm'];
  return runOrThrow(`npm ${args[0]}`, command, [...words, ...args], { env: npmEnvironment() });
}

/** An account without a home of its own keeps npm's cache here. */
function npmEnvironment() {
  try {
    accessSync(homedir(), constants.W_OK);
    return process.env;
  } catch {
    return { ...process.env, npm_config_cache: stateSubfolder('npm-cache') };
  }
}

import { createHash } from 'node:crypto';
import {
  existsSync,
  readFileSync,
  readdirSync,
  rmSync,
  statSync,
  utimesSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { withLock } from './lock.mjs';
import { root, stateSubfolder } from './paths.mjs';
import { runOrThrow } from './processes.mjs';
import { say } from './say.mjs';

/** What a build is made of. */
const SOURCES = [
  'src',
  'db',
  'data',
  'public',
  'astro.config.mjs',
  'tsconfig.json',
  'package-lock.json',
];
const BUILDS_KEPT = 3;
const DONE = 'complete';

/**
 * Builds the site unless these very sources were built before. Each build has a folder of its own,
 * so that a running server never loses the files it serves.
 * @returns {Promise<string>} the folder
 */
export function ensureBuild() {
  return withLock('build', async () => {
    const builds = stateSubfolder('build');
    const folder = join(builds, hashSources());
    if (!existsSync(join(folder, DONE))) {
      say('Building the site');
      rmSync(folder, { recursive: true, force: true });
      await runOrThrow(
        'astro build',
        process.execPath,
        ['node_modules/astro/astro.js', 'build', '--outDir', folder],
        { env: buildEnvironment() },
      );
      writeFileSync(join(folder, DONE), '');
    }
    utimesSync(folder, new Date(), new Date());
    removeOld(builds);
    return folder;
  });
}

/** No secret and no address of this machine is there to be written into a build. */
function buildEnvironment() {
  const { PATH, HOME, TMPDIR, CI } = process.env;
  return { PATH, HOME, TMPDIR, CI, NODE_ENV: 'production', ASTRO_TELEMETRY_DISABLED: '1' };
}

/** Names the build of the sources as they are now. */
export function hashSources() {
  const hash = createHash('sha256').update(process.version);
  const add = (path) => {
    const full = join(root, path);
    if (!existsSync(full)) return;
    if (statSync(full).isDirectory()) {
      for (const name of readdirSync(full).sort()) add(join(path, name));
    } else {
      hash.update(`\0${path}\0`).update(readFileSync(full));
    }
  };
  SOURCES.forEach(add);
  return hash.digest('hex').slice(0, 16);
}

/** @param {string} builds */
function removeOld(builds) {
  const usedLast = (name) => statSync(join(builds, name)).mtimeMs;
  const names = readdirSync(builds).sort((a, b) => usedLast(b) - usedLast(a));
  for (const name of names.slice(BUILDS_KEPT)) {
    rmSync(join(builds, name), { recursive: true, force: true });
  }
}

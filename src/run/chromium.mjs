import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { installDebianPackage } from './apt.mjs';
import { RunError } from './say.mjs';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome'];

/** The browser of the tests: CHROMIUM_PATH, else the one on PATH, else Debian's, installed. */
export async function ensureChromium() {
  const found = process.env.CHROMIUM_PATH ?? find();
  if (found) return found;
  await installDebianPackage('chromium', 'set CHROMIUM_PATH to a Chromium or Chrome.');
  const installed = find();
  if (installed) return installed;
  throw new RunError('Chromium was installed, but is not on PATH.');
}

function find() {
  const folders = ['/usr/bin', ...(process.env.PATH ?? '').split(delimiter)];
  const paths = folders.flatMap((folder) => NAMES.map((name) => join(folder, name)));
  return paths.find((path) => {
    try {
      accessSync(path, constants.X_OK);
      return true;
    } catch {
      return false;
    }
  });
}

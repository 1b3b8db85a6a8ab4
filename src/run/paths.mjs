import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';

/** The checkout. */
export const root = resolve(import.meta.dirname, '../..');

/** Everything that running the project leaves behind; ignored by git, safe to delete when stopped. */
export const stateFolder = join(root, '.ellwise');

/** A path inside the state folder. @param {string[]} names */
export const statePath = (...names) => join(stateFolder, ...names);

/** Makes a folder inside the state folder and returns its path. @param {string[]} names */
export function stateSubfolder(...names) {
  const folder = statePath(...names);
  mkdirSync(folder, { recursive: true });
  return folder;
}

import { madeMotifInput } from '../../../schemas/madeMotif';
import { madeContent, type KeptMade } from './keptMade';

const KEY = 'ellwise.made';
/** What is much longer was not written here. */
const MOST_CHARACTERS = 1_000_000;
/** A device is no archive: an account holds more. */
export const MOST_ON_DEVICE = 200;

/** The made motifs kept on this device: what is stored may be of an older edition or edited by hand. */
export function readDeviceMade(): KeptMade[] {
  try {
    const text = localStorage.getItem(KEY) ?? '[]';
    const stored: unknown = text.length > MOST_CHARACTERS ? [] : JSON.parse(text);
    if (!Array.isArray(stored)) return [];
    const found = new Map<string, KeptMade>();
    for (const each of stored.slice(0, MOST_ON_DEVICE)) {
      const { id, ...content } = (each ?? {}) as { id?: unknown };
      const { success, data } = madeMotifInput.safeParse(content);
      if (success && typeof id === 'string') found.set(id, { ...data, id, version: 1 });
    }
    return [...found.values()];
  } catch {
    return [];
  }
}

export function writeDeviceMade(made: readonly KeptMade[]): void {
  try {
    if (made.length === 0) return localStorage.removeItem(KEY);
    const stored = made.map((each) => ({ id: each.id, ...madeContent(each) }));
    localStorage.setItem(KEY, JSON.stringify(stored));
  } catch {
    // A browser without storage still corrects with them; it only cannot remember.
  }
}

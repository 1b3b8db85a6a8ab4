import { isTakenWord } from '../../../lib/pattern/terms/takenWord';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import { KEPT_LIMITS } from '../../../schemas/limits';
import { ownStitchInput } from '../../../schemas/ownStitch';
import { stitchContent, type KeptStitch } from './keptStitch';

const KEY = 'ellwise.stitches';
/** A stitch takes some 200 characters; what is much longer was not written here. */
const MOST_CHARACTERS = 200_000;

/** The stitches kept on this device: what is stored may be of an older edition or edited by hand. */
export function readDeviceStitches(): KeptStitch[] {
  try {
    const text = localStorage.getItem(KEY) ?? '[]';
    const stored: unknown = text.length > MOST_CHARACTERS ? [] : JSON.parse(text);
    if (!Array.isArray(stored)) return [];
    const found = new Map<string, KeptStitch>();
    for (const each of stored.slice(0, KEPT_LIMITS.stitches)) {
      const { success, data } = ownStitchInput.safeParse(each);
      if (success && !isTakenWord(data.abbreviation)) found.set(data.abbreviation, onDevice(data));
    }
    return [...found.values()];
  } catch {
    return [];
  }
}

export function writeDeviceStitches(stitches: readonly KeptStitch[]): void {
  try {
    if (stitches.length === 0) localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, JSON.stringify(stitches.map(stitchContent)));
  } catch {
    // A browser without storage still reads with them; it only cannot remember.
  }
}

export const onDevice = (stitch: OwnStitch): KeptStitch => ({
  ...stitch,
  id: stitch.abbreviation,
  version: 1,
});

import type { Terms } from '../reading';
import { STITCH_WORDS } from './stitchWords';
import { stitch } from '../../stitches/stitchTable';

/** What these terms write for a single word of the other set: "htr" is "hdc" in US terms. Null where nothing is. */
export function ownWordOf(written: string, terms: Terms): string | null {
  const other = terms === 'us' ? 'uk' : 'us';
  const code = STITCH_WORDS[other].get(written.toLowerCase());
  const found = code ? stitch(code) : null;
  return found && (terms === 'us' ? found.code : found.ukCode);
}

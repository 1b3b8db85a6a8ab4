import { abbreviationOf } from '../../lib/stitches/ownStitch';
import type { Stitch } from '../../lib/stitches/stitch';
import { stitch } from '../../lib/stitches/stitchTable';

export type Terms = 'us' | 'uk';

/** A stitch's abbreviation in the person's terms: dc is "dc" in US, "tr" in UK terms. */
export const stitchWord = (
  { code, ukCode }: Pick<Stitch, 'code' | 'ukCode'>,
  terms: Terms,
): string => (terms === 'us' ? abbreviationOf(code) : ukCode);

/** The same by US code. */
export function codeWord(code: string, terms: Terms): string {
  const found = stitch(code);
  return found ? stitchWord(found, terms) : code;
}

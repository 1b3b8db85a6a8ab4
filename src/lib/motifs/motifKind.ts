import { addCounts, totalCount } from '../stitches/counts';
import type { Motif } from './motif';

export const MOTIF_KINDS = ['solid', 'openwork', 'textured'] as const;
export type MotifKind = (typeof MOTIF_KINDS)[number];

/** Chain spaces of the sides, over its stitches, from which a motif is openwork: ours. */
const OPEN_SHARE = 0.12;
/** Clusters, popcorns, puffs, and stitches round the post or into one loop. */
const TEXTURED = /(?:cl| pc| puff)$|^(?:FP|BP|FL|BL)/;

/**
 * What a motif is like by its stitches: textured with any that stands out, else openwork where its
 * sides have many chain spaces, else solid. Spaces of the corners, which every motif has, do not count.
 *
 * Example: a group square of four rounds has 24 spaces on its sides and 120 dc: openwork.
 */
export function motifKind({ rounds }: Pick<Motif, 'rounds'>): MotifKind {
  const made = rounds.reduce((sum, round) => addCounts(sum, round.made), {});
  if (Object.keys(made).some((code) => TEXTURED.test(code))) return 'textured';
  const spaces = rounds.reduce((sum, { spaces, cornerSpace }) => {
    const all = Object.entries(spaces).filter(([kind]) => kind !== cornerSpace);
    return sum + all.reduce((count, [, each]) => count + each, 0);
  }, 0);
  const stitches = rounds.reduce((sum, { tally }) => sum + totalCount(tally), 0);
  return spaces > OPEN_SHARE * stitches ? 'openwork' : 'solid';
}

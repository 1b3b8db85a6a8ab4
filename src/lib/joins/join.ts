import type { LoopHeight } from '../motifs/motif';
import type { StitchCode, StitchCounts } from '../stitches/stitch';

/** How the count of one stitch grows with the side: fixed + perStitch × n + perRepeat × q, n = m q + r. */
export interface SideCount {
  readonly fixed?: number;
  readonly perStitch?: number;
  readonly perRepeat?: number;
}

export type SideCounts = Readonly<Record<StitchCode, SideCount>>;

/** The stitch counts of a side that a join fits: `multipleOf` × q + `plus`. */
export interface Fit {
  readonly multipleOf: number;
  readonly plus: number;
}

/** Fabric that a seam adds between two motifs: heights of stitches and of chain loops. */
export interface SeamWidth {
  readonly stitches: Readonly<Record<StitchCode, number>>;
  readonly loops: readonly (LoopHeight & { readonly times: number })[];
}

/** A way of joining finished motifs, or of joining them as their last rounds are worked. */
export interface Join {
  readonly key: string;
  readonly name: string;
  readonly description: string;
  readonly fit: Fit;
  /** Works into chain spaces along the sides of the motif's last round. */
  readonly needsSpaces?: boolean;
  /** Sewn with a needle along the seam; its yarn is a factor times the length. */
  readonly sewn: boolean;
  /** Rounds added to every motif before or as it is linked. */
  readonly roundsAdded: number;
  /** Worked once along every joined side. */
  readonly perSeam: SideCounts;
  /** Worked on every side of every motif, joined or not. */
  readonly perMotifSide: SideCounts;
  /** Worked at every corner of every motif. */
  readonly perMotifCorner: StitchCounts;
  /** Worked once for each time a corner links at a junction. */
  readonly perLink: StitchCounts;
  readonly width: SeamWidth;
  /** Where its yarn is attached: for each long line of seams, for each motif, or never anew. */
  readonly attached: 'line' | 'motif' | 'not';
  /** Stitches that the border finds on an outer side. */
  readonly outerSide: SideCount;
  readonly tool: 'hook' | 'needle';
  readonly surface: 'flat' | 'ridge';
  readonly reversible: boolean;
  readonly openness: 'closed' | 'slightly open' | 'open';
  readonly cautions: readonly string[];
}

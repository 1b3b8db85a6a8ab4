import type { StitchCode, StitchCounts } from '../stitches/stitch';

/** The shapes a motif can have: number of sides, 0 for a circle. */
export const MOTIF_SIDES = [0, 3, 4, 6, 8] as const;
export type MotifSides = (typeof MOTIF_SIDES)[number];

/** A round of chain loops anchored by short stitches: each loop of `chains` spans `gapStitches`. */
export interface LoopHeight {
  readonly chains: number;
  readonly gapStitches: number;
}

/** One round as worked: what the hook makes, and what the pattern counts. */
export interface MotifRound {
  /** As the pattern names it, "Rnd 1". */
  readonly label: string;
  /** Every stitch the hook makes, joining slip stitch and turning chain included. */
  readonly made: StitchCounts;
  /** The part of `made` that is left out when a new yarn is attached in place. */
  readonly travel: StitchCounts;
  /** What the pattern counts as stitches (a chain that counts as dc is a dc). */
  readonly tally: StitchCounts;
  /** Chain spaces by kind: `{ "ch-2": 4 }`. */
  readonly spaces: Readonly<Record<string, number>>;
  /** The kind of space at each corner, or null where a stitch is the corner. */
  readonly cornerSpace: string | null;
  /** Stitches and single-chain spaces between corner centres; round a circle, all of them. */
  readonly perSide: number;
  /** The stitch that sets the height of the round at the middle of a side, or its chain loops. */
  readonly height: StitchCode | LoopHeight;
}

/** What the first round is worked into. `chains` 0 is a magic ring. */
export interface Ring {
  readonly chains: number;
  readonly made: StitchCounts;
}

/** A motif as rounds of counted stitches, in US terms. */
export interface Motif {
  /** Stable address of a ready-made motif or the id of one's own. */
  readonly key: string;
  /** Which save of one's own motif this is; null for one that has never been saved. */
  readonly version: number | null;
  readonly name: string;
  readonly sides: MotifSides;
  readonly ring: Ring;
  readonly rounds: readonly MotifRound[];
}

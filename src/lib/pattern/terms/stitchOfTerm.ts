import type { Moves, StitchCode } from '../../stitches/stitch';

/** A stitch of one's own, as the reader needs it: the abbreviation and what it is made of. */
export interface StitchOfTerm {
  /** As patterns write it, letters only: "lst". It is the stitch's code too. */
  readonly code: StitchCode;
  readonly name: string;
  readonly moves: Moves;
  /** Stitches of the round below that it takes up; 1 where nothing is said. */
  readonly takes?: number;
}

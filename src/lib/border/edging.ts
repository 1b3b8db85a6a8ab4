import type { LoopHeight } from '../motifs/motif';
import type { Terms } from '../pattern/reading';
import type { StitchCode, StitchCounts } from '../stitches/stitch';

/** A round of border from its text, as it works out round any edge. */
export interface Edging {
  readonly name: string;
  /** One round, as written. */
  readonly text: string;
  readonly terms: Terms;
  /** Stitches that it works over: `least`, or any number of repeats of `multipleOf` more. */
  readonly over: { readonly least: number; readonly multipleOf: number };
  /** Everything the hook makes over `least` stitches, and in each further repeat. */
  readonly made: { readonly least: StitchCounts; readonly perRepeat: StitchCounts };
  /** Stitches and chains of spaces that the next round finds, in the same way. */
  readonly top: { readonly least: number; readonly perRepeat: number };
  readonly height: StitchCode | LoopHeight;
}

/** Figures of the top, right, bottom and left of a blanket, each from one corner stitch up to the next. */
export type FourSides = readonly [top: number, right: number, bottom: number, left: number];

export const mapSides = (sides: FourSides, of: (side: number, i: number) => number): FourSides =>
  sides.map(of) as unknown as FourSides;

export const sumSides = (sides: FourSides): number => sides.reduce((sum, side) => sum + side, 0);

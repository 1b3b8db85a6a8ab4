import type { Glyph } from './glyph';
import type { Point } from './point';

/** The symbol of one stitch that the hook makes, placed. */
export interface ChartSymbol {
  /** Index of its round, -1 for the ring or foundation chain. */
  readonly round: number;
  /** Index of the stitch in its round. */
  readonly stitch: number;
  readonly glyph: Glyph;
  /** Where it stands: one foot, or one for each leg of a decrease. Of an oval: the end it begins at. */
  readonly feet: readonly Point[];
  readonly head: Point;
  /** How wide a stitch is here: symbols are narrower where a round is crowded. */
  readonly unitMm: number;
}

import type { GridCounts } from '../layout/gridCounts';
import type { Layout } from '../layout/layouts';
import type { FourSides } from './edging';

/** Stitches worked at an outer junction, one in the corner of either motif. */
const PER_JUNCTION = 2;

/**
 * Stitches that a border's first round finds: every stitch of every outer side, two at each outer
 * junction and one at each outer corner.
 *
 * Example: 10 × 8 squares of 15: 36 × 15 + 32 × 2 + 4 = 608, of which the next round makes 616 in sc.
 */
export const edgeStitches = (counts: GridCounts, outerSideStitches: number): number =>
  counts.outerSides * outerSideStitches + counts.edgeJunctions * PER_JUNCTION + counts.outerCorners;

/** What the four sides of an edge follow from. */
export interface EdgeOf {
  readonly layout: Layout;
  readonly rows: number;
  readonly columns: number;
  readonly counts: GridCounts;
  readonly size: { readonly widthMm: number; readonly heightMm: number };
}

/**
 * The same by side, each from one corner stitch up to the next. Squares in a grid have four straight
 * sides; round any other outline the stitches are shared out as width and height are (ours).
 */
export function edgeSides(of: EdgeOf, outerSideStitches: number): FourSides {
  if (of.layout === 'square') {
    const side = (motifs: number): number =>
      motifs * outerSideStitches + (motifs - 1) * PER_JUNCTION + 1;
    const [across, down] = [side(of.columns), side(of.rows)];
    return [across, down, across, down];
  }
  const all = Math.round(edgeStitches(of.counts, outerSideStitches));
  const { widthMm, heightMm } = of.size;
  const across = Math.round((all * widthMm) / (2 * (widthMm + heightMm)));
  const down = Math.floor((all - 2 * across) / 2);
  return [across + ((all - 2 * across) % 2), down, across, down];
}

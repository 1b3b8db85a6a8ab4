import type { StitchCounts } from '../stitches/stitch';
import { fitOf } from './fit';
import type { Join, SideCount, SideCounts } from './join';

/** Stitches on a side of n stitches and q whole repeats: `sideCount({ perRepeat: 2, fixed: 1 }, 15, 3)` is 7. */
export const sideCount = (
  { fixed = 0, perStitch = 0, perRepeat = 0 }: SideCount,
  n: number,
  repeats: number,
): number => fixed + perStitch * n + perRepeat * repeats;

/**
 * Stitches that `counts` asks of one side of n stitches. Where the side does not fit, the whole
 * repeats that there is room for, stretched over the rest in proportion: a figure to plan with.
 */
export function countsOnSide(join: Join, counts: SideCounts, n: number): StitchCounts {
  const repeats = plannedRepeats(join, n);
  return Object.fromEntries(
    Object.entries(counts).map(([code, count]) => [code, sideCount(count, n, repeats)]),
  );
}

/** Stitches that a border finds on an outer side of n stitches after this join. */
export const outerSideStitches = (join: Join, n: number): number =>
  sideCount(join.outerSide, n, plannedRepeats(join, n));

function plannedRepeats(join: Join, n: number): number {
  const fit = fitOf(n, join.fit);
  return fit.fits ? fit.repeats : Math.max(0, (n - join.fit.plus) / join.fit.multipleOf);
}

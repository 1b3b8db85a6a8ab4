import type { GridCounts } from '../layout/gridCounts';
import type { StitchCode, StitchCounts } from '../stitches/stitch';
import { knownStitch } from '../stitches/stitchTable';

/** Corners of the finished blanket, where every round grows. */
const BLANKET_CORNERS = 4;
/** Stitches worked at an outer junction, one in the corner of either motif. */
const PER_JUNCTION = 2;

/** Stitches in each corner of a round that lies flat: 3 up to hdc, 5 dc, 7 taller (common practice, no source). */
function inCorner(code: StitchCode): number {
  const { heightOverWidth } = knownStitch(code);
  return heightOverWidth < 1.6 ? 3 : heightOverWidth < 2.4 ? 5 : 7;
}

/**
 * Stitches made in each round of a border. The first round takes every stitch of every outer side,
 * two at each outer junction and one at each outer corner, made three in the blanket's own four;
 * every later round repeats the round below and grows at those four: by 8 in sc. Each round starts with its turning chain
 * and closes with a slip stitch.
 *
 * Example: 10 × 8 squares of 15, two rounds of sc: 36 × 15 + 32 × 2 + 12 = 616, then 624.
 */
export function borderRounds(
  codes: readonly StitchCode[],
  counts: GridCounts,
  outerSideStitches: number,
): StitchCounts[] {
  let below =
    counts.outerSides * outerSideStitches +
    counts.edgeJunctions * PER_JUNCTION +
    counts.outerCorners;
  return codes.map((code) => {
    const stitches = below + BLANKET_CORNERS * (inCorner(code) - 1);
    below = stitches;
    return { [code]: stitches, ch: knownStitch(code).turningChains, 'sl st': 1 };
  });
}

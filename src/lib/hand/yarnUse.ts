import type { StitchCode, StitchCounts } from '../stitches/stitch';
import { loopsByStitch } from '../stitches/loops';

/** What a piece takes, before it is known how long this maker's loops are. */
export interface YarnUse {
  readonly loops: ReadonlyMap<StitchCode, number>;
  /** Length of sewn seam, in metres. */
  readonly seamM: number;
  /** Tails and other yarn of known length, in metres. */
  readonly cutM: number;
}

/** Yarn use of counted stitches. */
export const useOfStitches = (made: StitchCounts): YarnUse => ({
  loops: loopsByStitch(made),
  seamM: 0,
  cutM: 0,
});

export const NO_YARN: YarnUse = { loops: new Map(), seamM: 0, cutM: 0 };

/** One use and `times` the other, together. */
export function addUse(left: YarnUse, right: YarnUse, times = 1): YarnUse {
  const loops = new Map(left.loops);
  for (const [code, count] of right.loops) loops.set(code, (loops.get(code) ?? 0) + count * times);
  return {
    loops,
    seamM: left.seamM + right.seamM * times,
    cutM: left.cutM + right.cutM * times,
  };
}

import type { Gauge } from '../gauge/gauge';
import { roundHeightMm } from '../motifs/geometry';
import type { Join } from './join';

/** Fabric that one seam of this join adds between two motifs, in mm; sewn seams add none. */
export function seamWidthMm({ width }: Join, gauge: Gauge): number {
  const stitchesMm = Object.entries(width.stitches).reduce(
    (sum, [code, heights]) => sum + heights * gauge.heightMm(code),
    0,
  );
  return width.loops.reduce(
    (sum, loop) => sum + loop.times * roundHeightMm({ height: loop }, gauge),
    stitchesMm,
  );
}

/** Fabric outside the outermost motifs: a join of added rounds leaves half a seam there, others none. */
export const joinEdgeMm = (join: Join, gauge: Gauge): number =>
  join.roundsAdded > 0 ? seamWidthMm(join, gauge) / 2 : 0;

import type { Gauge } from '../gauge/gauge';
import { roundHeightMm } from '../motifs/geometry';
import type { BorderRound } from '../plan/plan';

/** How wide one round of border is, in mm; picots hang over it. */
export const borderRoundMm = ({ stitch, edging }: BorderRound, gauge: Gauge): number =>
  edging ? roundHeightMm(edging, gauge) : gauge.heightMm(stitch);

import { learnHand, type Hand } from '../hand/hand';
import { NO_YARN } from '../hand/yarnUse';
import type { Blanket } from './blanketOf';
import { useOfGroup } from './colourLedger';
import { evidenceOf, swatchUse } from './evidenceOf';
import type { PieceGroup } from './pieces';

/** The hand learnt from the plan's evidence, for every stitch of the blanket, the evidence and the swatch. */
export function handOf({ plan, gauge }: Blanket, groups: readonly PieceGroup[]): Hand {
  const evidence = evidenceOf(plan, gauge.stitchWidthMm);
  const swatch = swatchUse(plan) ?? NO_YARN;
  const uses = [...groups.map(useOfGroup), ...evidence.map(({ use }) => use), swatch];
  const stitches = [...new Set(uses.flatMap(({ loops }) => [...loops.keys()]))].sort();
  return learnHand(gauge.stitchWidthMm, stitches, evidence);
}

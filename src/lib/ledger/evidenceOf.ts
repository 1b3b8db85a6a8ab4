import { usualM, type Evidence } from '../hand/hand';
import { readingLengthM, readingVarianceM2 } from '../hand/readingVariance';
import { addUse, NO_YARN, useOfStitches, type YarnUse } from '../hand/yarnUse';
import type { Plan, PlanEvidence } from '../plan/plan';
import type { StitchCounts } from '../stitches/stitch';
import { swatchCounts } from '../stitches/swatchCounts';
import { motifPieces } from './pieces';
import { TAIL_KEPT, TAIL_M } from './tails';

/**
 * The plan's weighed and unravelled pieces as evidence about the hand of a maker of this stitch
 * width. How much a piece may differ is taken from what it usually takes, not from its reading: a
 * reading that came out low would otherwise count as the surer for it, and makers would run short
 * more often than said.
 */
export function evidenceOf(plan: Plan, stitchWidthMm: number): Evidence[] {
  const { putUp } = plan.yarn;
  return plan.evidence.flatMap((item) => {
    const use = useOfPiece(plan, item);
    if (!use) return [];
    const motifs = item.piece === 'motifs' ? item.count : 0;
    return [
      {
        use,
        lengthM: readingLengthM(item.reading, putUp),
        varianceM2: readingVarianceM2(item.reading, putUp, usualM(stitchWidthMm, use), motifs),
      },
    ];
  });
}

/** Yarn use of a measured piece, or null where the plan has no such piece (a swatch not yet made). */
export function useOfPiece(plan: Plan, item: PlanEvidence): YarnUse | null {
  if (item.piece === 'swatch') return swatchUse(plan);
  if (item.piece === 'counted') return trimmed(item.made, item.tails);
  return motifUse(plan, item.motifIndex, item.count);
}

/** Yarn use of the plan's swatch, or null before there is one. */
export const swatchUse = ({ swatch }: Plan): YarnUse | null =>
  swatch && trimmed(swatchCounts(swatch.stitch, swatch.stitches, swatch.rows), 2);

/** Yarn use of `count` finished motifs, in the first colourway that uses the motif, or null. */
export function motifUse(plan: Plan, motifIndex: number, count: number): YarnUse | null {
  const colourway = plan.colourways.find((each) => each.motifIndex === motifIndex);
  if (!colourway) return null;
  return motifPieces({ plan }, colourway, count)
    .flatMap(({ lines }) => lines)
    .reduce((use, line) => addUse(use, trimmed(line.made, line.tails), count), NO_YARN);
}

/** A piece whose tails are woven in and trimmed keeps only a part of each. */
const trimmed = (made: StitchCounts, tails: number): YarnUse => ({
  ...useOfStitches(made),
  cutM: tails * TAIL_M * TAIL_KEPT,
});

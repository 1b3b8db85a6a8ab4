import { expectedM, handVarianceM2, learnHand, usualM, type Hand } from '../hand/hand';
import { readingLengthM, readingVarianceM2 } from '../hand/readingVariance';
import { addUse, NO_YARN, useOfStitches, type YarnUse } from '../hand/yarnUse';
import { READING_TOLERANCE } from '../ledger/notices';
import { TAIL_KEPT, TAIL_M } from '../ledger/tails';
import type { PlanEvidence, PutUp, YarnReading } from '../plan/plan';
import { addCounts, scaleCounts } from '../stitches/counts';
import type { StitchCounts } from '../stitches/stitch';
import { massG } from '../units/quantities';
import type { Motif } from './motif';

/** Like motifs weighed together, each worked in so many yarns. */
export interface WeighedMotifs {
  readonly count: number;
  readonly massG: number;
  readonly resolutionG: number;
  /** How often a yarn was attached to each: two tails every time. */
  readonly yarns: number;
}

/** Yarn of one motif, in metres, as believed at some point. */
export interface YarnBelief {
  readonly meanM: number;
  readonly sdM: number;
}

export interface MadeYarn {
  /** Of one motif, as the scale says. */
  readonly readM: number;
  /** From the stitch width alone, and once motifs were weighed. */
  readonly before: YarnBelief;
  readonly after: YarnBelief;
  /** The reading is further from what such motifs usually take than makers differ. */
  readonly questioned: boolean;
}

/**
 * What weighing finished motifs says about the yarn of one, in a hand of this stitch width.
 * The motif is worked to its last round: cut it to the rounds that were made.
 *
 * Example: 4 motifs of 100 loops each at 8 mm a stitch, 4.4 g a motif at 1 m/g on a scale to 0.1 g:
 * from 4.385 m give or take 0.858 m to 4.400 m give or take 0.109 m (one standard deviation).
 */
export function madeYarn(
  motif: Motif,
  weighed: WeighedMotifs,
  putUp: PutUp,
  stitchWidthMm: number,
): MadeYarn {
  const use = useOfMotif(motif, weighed.yarns);
  const all = addUse(NO_YARN, use, weighed.count);
  const reading = readingOf(weighed);
  const evidence = {
    use: all,
    lengthM: readingLengthM(reading, putUp),
    varianceM2: readingVarianceM2(reading, putUp, usualM(stitchWidthMm, all), weighed.count),
  };
  const codes = [...use.loops.keys()];
  const before = learnHand(stitchWidthMm, codes, []);
  const after = learnHand(stitchWidthMm, codes, [evidence]);
  const usualSdM = Math.sqrt(handVarianceM2(before, all) + evidence.varianceM2);
  return {
    readM: evidence.lengthM / weighed.count,
    before: beliefOf(before, use),
    after: beliefOf(after, use),
    questioned: Math.abs(evidence.lengthM - expectedM(before, all)) > READING_TOLERANCE * usualSdM,
  };
}

/** The weighing as a piece of a plan that has some other motif: counted stitches and tails. */
export const countedMotifs = (motif: Motif, weighed: WeighedMotifs): PlanEvidence => ({
  piece: 'counted',
  label: `${weighed.count} × ${motif.name}`.slice(0, 80),
  made: scaleCounts(madeOf(motif), weighed.count),
  tails: weighed.count * tailsOf(weighed),
  reading: readingOf(weighed),
});

export const readingOf = (weighed: WeighedMotifs): YarnReading => ({
  by: 'weighing',
  massG: massG(weighed.massG),
  resolutionG: massG(weighed.resolutionG),
});

const tailsOf = ({ yarns }: Pick<WeighedMotifs, 'yarns'>): number => 2 * yarns;

/** Every stitch of the motif, with what its tails keep once woven in and trimmed. */
const useOfMotif = (motif: Motif, yarns: number): YarnUse => ({
  ...useOfStitches(madeOf(motif)),
  cutM: tailsOf({ yarns }) * TAIL_M * TAIL_KEPT,
});

const madeOf = ({ ring, rounds }: Motif): StitchCounts =>
  rounds.reduce((sum, { made }) => addCounts(sum, made), ring.made);

const beliefOf = (hand: Hand, use: YarnUse): YarnBelief => ({
  meanM: expectedM(hand, use),
  sdM: Math.sqrt(handVarianceM2(hand, use)),
});

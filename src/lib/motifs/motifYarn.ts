import type { Gauge } from '../gauge/gauge';
import { expectedM, learnHand } from '../hand/hand';
import { useOfStitches } from '../hand/yarnUse';
import { addCounts } from '../stitches/counts';
import type { Motif } from './motif';

/** Metres of yarn that a motif takes in a hand of this gauge, tails apart, before anything is weighed. */
export function motifYarnM({ ring, rounds }: Pick<Motif, 'ring' | 'rounds'>, gauge: Gauge): number {
  const made = rounds.reduce((sum, round) => addCounts(sum, round.made), ring.made);
  return expectedM(learnHand(gauge.stitchWidthMm, Object.keys(made), []), useOfStitches(made));
}

import type { Motif, MotifRound } from '../motifs/motif';
import type { Reading, WorkedRound } from './reading';

/** What the estimator needs of a motif that has been read: its rounds as counted stitches. */
export function motifOf({ ring, rounds, sides }: Reading, key: string, name: string): Motif {
  return {
    key,
    version: null,
    name,
    sides,
    ring: { chains: ring.chains, made: ring.made },
    rounds: rounds.map(motifRound),
  };
}

const motifRound = (round: WorkedRound): MotifRound => ({
  label: round.label,
  made: round.made,
  travel: round.travel,
  tally: round.tally,
  spaces: round.spaces,
  cornerSpace: round.corner?.kind === 'space' ? round.corner.space : null,
  perSide: round.perSide,
  height: round.height,
});

import { describe, expect, it } from 'vitest';
import { motifChanges, readyMotif, type Motif } from '../../../src/lib';

const square = (rounds: number) => readyMotif('group-square', rounds) as Motif;
const NOTHING = { sides: null, roundsGone: 0, roundsMore: 0, rounds: [] };

describe('motifChanges', () => {
  it('finds nothing between a motif and itself', () => {
    expect(motifChanges(square(4), square(4))).toEqual(NOTHING);
  });

  it('knows that a plan may work fewer rounds than its motif has', () => {
    expect(motifChanges(square(3), square(8))).toEqual({ ...NOTHING, roundsMore: 5 });
  });

  it('tells the rounds that are gone', () => {
    expect(motifChanges(square(5), square(4))).toEqual({ ...NOTHING, roundsGone: 1 });
  });

  it('tells each round that is made otherwise, with what it counts before and now', () => {
    const now: Motif = {
      ...square(2),
      rounds: square(2).rounds.map((round, i) =>
        i === 1 ? { ...round, made: { ...round.made, dc: 27 }, tally: { dc: 28 } } : round,
      ),
    };
    expect(motifChanges(square(2), now).rounds).toEqual([
      { label: 'Rnd 2', before: { dc: 24 }, now: { dc: 28 } },
    ]);
  });

  it('sees a round that counts the same but is made otherwise', () => {
    const now: Motif = {
      ...square(1),
      rounds: square(1).rounds.map((round) => ({ ...round, spaces: { 'ch-3': 4 } })),
    };
    expect(motifChanges(square(1), now).rounds).toHaveLength(1);
  });

  it('tells a change of shape', () => {
    const hexagon = readyMotif('hexagon', 1) as Motif;
    expect(motifChanges(square(1), hexagon).sides).toEqual([4, 6]);
  });
});

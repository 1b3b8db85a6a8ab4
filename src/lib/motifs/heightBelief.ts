import type { Gauge } from '../gauge/gauge';
import { posterior, type Belief, type Observation } from '../stats/posterior';
import { apothemsAcross, MEASURED_SIDE_SPREAD, ringRadiusMm, roundHeightMm } from './geometry';
import type { Motif, MotifRound } from './motif';

/** How much one round differs in height from the others of its kind, relative: ours. */
export const OWN_ROUND_SPREAD = 0.04;
/** Relative spread of the radius of the foundation ring: ours. */
export const RING_SPREAD = 0.2;
/** No tape on crochet reads finer than this, in mm: ours. */
export const LEAST_TAPE_ERROR_MM = 0.5;

/** What a made motif measured across after one of its rounds, the first being 1. */
export interface RoundSize {
  readonly round: number;
  readonly acrossMm: number;
}

/**
 * What is believed about the heights of a motif's rounds. The unknowns are the radius of the ring
 * in mm, how much taller each kind of round comes out than the gauge says, and the same of each
 * round alone, both relative, so that the prior is diagonal.
 */
export interface HeightBelief {
  readonly belief: Belief;
  /** Sum of unknowns that the height of a round adds, beside its height by the gauge. */
  readonly heightRow: (round: number) => number[];
  /** The same of the size across after a round. */
  readonly acrossRow: (round: number) => number[];
  /** Which unknown says how much taller than by the gauge rounds of this kind are. */
  readonly kindOf: (round: number) => number;
}

/** Standard deviation of a size read from a tape, in mm: `tapeErrorMm(120)` is 1.2, of 30 mm 0.5. */
export const tapeErrorMm = (acrossMm: number): number =>
  Math.max(MEASURED_SIDE_SPREAD * acrossMm, LEAST_TAPE_ERROR_MM);

/** Heights by the gauge, then what the sizes measured say of them: the exact posterior. */
export function heightBelief(
  motif: Motif,
  gauge: Gauge,
  sizes: readonly RoundSize[],
): HeightBelief {
  const { rounds } = motif;
  const kinds = [...new Set(rounds.map(kindOfRound))];
  const heightsMm = rounds.map((round) => roundHeightMm(round, gauge));
  const ringMm = ringRadiusMm(motif, gauge);
  const apothems = apothemsAcross(motif.sides);
  const kindOf = (round: number): number =>
    1 + kinds.indexOf(kindOfRound(rounds[round - 1] as MotifRound));
  const ownOf = (round: number): number => kinds.length + round;

  function apothemRow(ring: number, from: number, to: number): number[] {
    const row = [ring, ...kinds.map(() => 0), ...rounds.map(() => 0)];
    for (let round = from; round <= to; round += 1) {
      const heightMm = heightsMm[round - 1] as number;
      row[kindOf(round)] = (row[kindOf(round)] as number) + heightMm;
      row[ownOf(round)] = heightMm;
    }
    return row;
  }
  const acrossRow = (round: number): number[] =>
    apothemRow(1, 1, round).map((each) => apothems * each);
  const expectedMm = (round: number): number =>
    apothems * (ringMm + heightsMm.slice(0, round).reduce((sum, each) => sum + each, 0));

  const prior = {
    mean: [ringMm, ...kinds.map(() => 0), ...rounds.map(() => 0)],
    variance: [
      (RING_SPREAD * ringMm) ** 2,
      ...kinds.map((kind) => gauge.heightSpread(kind) ** 2),
      ...rounds.map(() => OWN_ROUND_SPREAD ** 2),
    ],
  };
  const observations = sizes.map(({ round, acrossMm }): Observation => ({
    row: acrossRow(round),
    // The row leaves out the heights by the gauge, which are known.
    value: acrossMm - (expectedMm(round) - apothems * ringMm),
    variance: tapeErrorMm(acrossMm) ** 2,
  }));
  return {
    belief: posterior(prior, observations),
    heightRow: (round) => apothemRow(0, round, round),
    acrossRow,
    kindOf,
  };
}

/** Loops of chains err together, like the rounds of one stitch. */
const kindOfRound = ({ height }: MotifRound): string =>
  typeof height === 'string' ? height : 'ch';

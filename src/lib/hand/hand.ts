import { DomainError } from '../errors';
import { dot } from '../stats/linear';
import {
  posterior,
  varianceAfter,
  varianceOf,
  type Belief,
  type Observation,
} from '../stats/posterior';
import type { StitchCode } from '../stitches/stitch';
import type { YarnUse } from './yarnUse';

/** Yarn per loop over single crochet stitch width (windchilde.com rows: 5.10 to 5.30). */
export const LOOP_OVER_WIDTH = 5.2;
/** Spread of that factor between makers, from the same source. */
export const MAKER_SPREAD = 0.2;
/** Spread of one stitch around a maker's own factor: ours. */
export const STITCH_SPREAD = 0.05;
/** Yarn over length of a sewn seam: rule of thumb, from memory; its spread is ours. */
export const SEWN_FACTOR = 3;
export const SEWN_SPREAD = 0.2;

/** A piece that was weighed or unravelled. */
export interface Evidence {
  readonly use: YarnUse;
  /** Yarn it took, in metres, tails included. */
  readonly lengthM: number;
  readonly varianceM2: number;
}

/**
 * What is believed about one maker's yarn per loop, in mm, for each stitch, and yarn per length
 * sewn. The unknowns are a factor common to all stitches, a deviation for each stitch, and the
 * sewing factor, so that the prior is diagonal.
 */
export interface Hand {
  /** Width of the single crochet stitch that the prior was set from. */
  readonly stitchWidthMm: number;
  readonly belief: Belief;
  readonly stitches: readonly StitchCode[];
  /** Stitches that some evidence contained. */
  readonly measured: ReadonlySet<StitchCode>;
}

/**
 * A maker's hand, from the width of her single crochet stitch and her evidence.
 *
 * Example: width 8.128 mm and no evidence: 42.27 mm a loop, give or take 20.6 % for any one stitch.
 */
export function learnHand(
  stitchWidthMm: number,
  stitches: readonly StitchCode[],
  evidence: readonly Evidence[],
): Hand {
  const loopMm = LOOP_OVER_WIDTH * stitchWidthMm;
  const prior = {
    mean: [loopMm, ...stitches.map(() => 0), SEWN_FACTOR],
    variance: [
      (MAKER_SPREAD * loopMm) ** 2,
      ...stitches.map(() => (STITCH_SPREAD * loopMm) ** 2),
      (SEWN_SPREAD * SEWN_FACTOR) ** 2,
    ],
  };
  const measured = new Set<StitchCode>();
  const observations = evidence.map(({ use, lengthM, varianceM2 }): Observation => {
    for (const [code, loops] of use.loops) if (loops > 0) measured.add(code);
    return { row: rowOf(stitches, use), value: lengthM - use.cutM, variance: varianceM2 };
  });
  return { stitchWidthMm, belief: posterior(prior, observations), stitches, measured };
}

/** Yarn that a piece usually takes at this stitch width, in metres, before anything is weighed. */
export function usualM(stitchWidthMm: number, { loops, seamM, cutM }: YarnUse): number {
  const allLoops = [...loops.values()].reduce((sum, count) => sum + count, 0);
  return (LOOP_OVER_WIDTH * stitchWidthMm * allLoops) / 1000 + SEWN_FACTOR * seamM + cutM;
}

/** Expected yarn per loop of one stitch, in mm. */
export function loopLengthMm(hand: Hand, code: StitchCode): number {
  const [common = NaN] = hand.belief.mean;
  return common + (hand.belief.mean[1 + placeOf(hand.stitches, code)] ?? NaN);
}

/** Expected yarn per length of sewn seam. */
export const sewnFactor = (hand: Hand): number => hand.belief.mean.at(-1) ?? NaN;

/** Expected yarn of a piece, in metres. */
export const expectedM = (hand: Hand, use: YarnUse): number =>
  dot(rowOf(hand.stitches, use), hand.belief.mean) + use.cutM;

/** Variance in m² that comes from not knowing this maker's hand; it does not average out. */
export const handVarianceM2 = (hand: Hand, use: YarnUse): number =>
  varianceOf(hand.belief, rowOf(hand.stitches, use));

/** The same after one more piece had been measured. */
export const handVarianceAfterM2 = (
  hand: Hand,
  use: YarnUse,
  next: Omit<Evidence, 'lengthM'>,
): number =>
  varianceAfter(hand.belief, rowOf(hand.stitches, use), {
    row: rowOf(hand.stitches, next.use),
    variance: next.varianceM2,
  });

/** Knowing a factor exactly is an observation of it without noise; this is small enough to be none. */
const NO_NOISE = 1e-12;

/** The part of `handVarianceM2` that would remain if the factor common to all stitches were known. */
export const ownStitchVarianceM2 = (hand: Hand, use: YarnUse): number =>
  varianceAfter(hand.belief, rowOf(hand.stitches, use), { row: [1], variance: NO_NOISE });

/** How strongly the yarn of two pieces varies together, in m². */
export const handCovarianceM2 = (hand: Hand, left: YarnUse, right: YarnUse): number => {
  const row = rowOf(hand.stitches, right);
  return dot(
    rowOf(hand.stitches, left),
    hand.belief.covariance.map((line) => dot(line, row)),
  );
};

/** Metres of yarn per mm of loop, for each unknown; per unit of the sewing factor for the last. */
function rowOf(stitches: readonly StitchCode[], { loops, seamM }: YarnUse): number[] {
  const perStitch = stitches.map(() => 0);
  for (const [code, count] of loops) perStitch[placeOf(stitches, code)] = count / 1000;
  return [perStitch.reduce((sum, value) => sum + value, 0), ...perStitch, seamM];
}

function placeOf(stitches: readonly StitchCode[], code: StitchCode): number {
  const place = stitches.indexOf(code);
  if (place < 0)
    throw new DomainError(
      'stitch-not-in-hand',
      `A hand of ${stitches.join(', ')} knows no "${code}"`,
    );
  return place;
}

import type { JoinComparison, JoinYarn } from './compareJoins';

/** What can make one join take less yarn than another. */
export type YarnCause = 'sewing' | 'stitches' | 'loops' | 'loop length' | 'tails';

export interface Why {
  readonly cheapest: JoinComparison;
  /** Joins that take as much as the cheapest. */
  readonly alike: readonly JoinComparison[];
  /** The least dear of the others. */
  readonly next: JoinComparison;
  readonly lessM: number;
  /** Adds up to `lessM`, the weightiest first; below 0 it speaks for `next`. */
  readonly reasons: readonly { readonly cause: YarnCause; readonly lessM: number }[];
}

/** Yarn that nobody would notice, in m. */
const ALIKE_M = 0.05;

/**
 * Why the join that takes least yarn does so, against the next: its tails, and its stitches as their
 * number × loops in one × yarn of a loop, the difference shared out by logarithmic means (Ang, "The
 * LMDI approach to decomposition analysis", Energy Policy 33, 2005: exact, without remainder). Joins
 * that do not fit the side count only where none does. Null where fewer than two differ.
 *
 * Example: 100 m in 4,000 single loops against 200 m in 4,000 double ones: 100 m, all by "loops".
 */
export function whyCheapest(comparisons: readonly JoinComparison[]): Why | null {
  const fitting = comparisons.filter(({ fits }) => fits);
  const [cheapest, ...others] = (fitting.length > 0 ? fitting : comparisons).toSorted(
    (left, right) => left.joinM - right.joinM,
  );
  const next = others.find(({ joinM }) => joinM - (cheapest?.joinM ?? 0) > ALIKE_M);
  if (!cheapest || !next) return null;
  return {
    cheapest,
    alike: others.slice(0, others.indexOf(next)),
    next,
    lessM: next.joinM - cheapest.joinM,
    reasons: reasonsOf(cheapest.yarn, next.yarn),
  };
}

function reasonsOf(cheap: JoinYarn, dear: JoinYarn): Why['reasons'] {
  const reasons = [...workedReasons(cheap, dear), reason('tails', dear.tailsM - cheap.tailsM)];
  return reasons
    .filter(({ lessM }) => lessM !== 0)
    .toSorted((left, right) => Math.abs(right.lessM) - Math.abs(left.lessM));
}

const reason = (cause: YarnCause, lessM: number): Why['reasons'][number] => ({ cause, lessM });

function workedReasons(cheap: JoinYarn, dear: JoinYarn): Why['reasons'] {
  const [low, high] = [worked(cheap), worked(dear)];
  if (low.loopsM === 0 || high.loopsM === 0) {
    return [reason('sewing', high.loopsM + dear.sewnM - low.loopsM - cheap.sewnM)];
  }
  const meanM = logarithmicMean(low.loopsM, high.loopsM);
  return [
    reason('sewing', dear.sewnM - cheap.sewnM),
    reason('stitches', meanM * Math.log(high.count / low.count)),
    reason('loops', meanM * Math.log(high.loopsEach / low.loopsEach)),
    reason('loop length', meanM * Math.log(high.eachM / low.eachM)),
  ];
}

/** Stitches of a join, loops in one, and metres in a loop, taken over all of them. */
export function worked({ stitches }: JoinYarn) {
  const sum = (of: 'count' | 'loops' | 'lengthM') =>
    stitches.reduce((total, each) => total + each[of], 0);
  const [count, loops, loopsM] = [sum('count'), sum('loops'), sum('lengthM')];
  return { count, loopsM, loopsEach: loops / count, eachM: loopsM / loops };
}

const logarithmicMean = (a: number, b: number): number => (a === b ? a : (a - b) / Math.log(a / b));

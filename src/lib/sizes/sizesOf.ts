import { estimate } from '../ledger/estimate';
import type { Estimate } from '../ledger/ledger';
import type { Plan } from '../plan/plan';
import { widthMm } from '../units/quantities';
import type { BlanketSize } from './blanketSizes';

/** A plan at one of several sizes. */
export interface SizedPlan {
  readonly target: BlanketSize;
  readonly rows: number;
  readonly columns: number;
  readonly size: Estimate['size'];
  /** Of every colour of the plan, in its order. */
  readonly colours: Estimate['colours'];
  readonly totals: Estimate['totals'];
}

/** The plan with a size wanted, kept to as the plan says: nearest, where it says nothing. */
export const withTarget = (
  plan: Plan,
  target: Pick<BlanketSize, 'widthMm' | 'heightMm'>,
): Plan => ({
  ...plan,
  size: {
    by: 'target',
    widthMm: widthMm(target.widthMm),
    heightMm: widthMm(target.heightMm),
    rule: plan.size.by === 'target' ? plan.size.rule : 'nearest',
  },
});

/**
 * What the plan takes at each size: motifs, finished size, yarn and skeins of each colour, cost.
 * All that differs is the grid; colourways take their places anew in it.
 * Throws DomainError as `estimate` does, and for a size that is not positive.
 *
 * Example: the front page's squares as a throw of 50 × 70 in: 9 × 13 motifs.
 */
export function sizesOf(plan: Plan, targets: readonly BlanketSize[]): SizedPlan[] {
  return targets.map((target) => {
    const { rows, columns, size, colours, totals } = estimate(withTarget(plan, target));
    return { target, rows, columns, size, colours, totals };
  });
}

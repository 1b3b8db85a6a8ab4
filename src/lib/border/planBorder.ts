import { readyJoin } from '../joins/readyJoins';
import type { Estimate } from '../ledger/ledger';
import { outerStitches } from '../ledger/pieces';
import type { Plan } from '../plan/plan';
import { borderChecks, type BorderCheck } from './borderFit';
import { edgeSides } from './edge';

/** The border of a plan round by round. `estimate` must be that of the plan. */
export function planBorder(plan: Plan, estimate: Estimate): BorderCheck[] {
  const join = readyJoin(plan.join.key);
  if (!join) return [];
  const n = outerStitches(plan, join, estimate.sideStitches);
  return borderChecks(plan.border, edgeSides(estimate, n));
}

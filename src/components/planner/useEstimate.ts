import { useMemo, useRef } from 'react';
import { DomainError } from '../../lib/errors';
import { estimate as estimateOf } from '../../lib/ledger/estimate';
import type { Estimate } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';

/**
 * The estimate of a plan; while the plan is out of the model's domain, the last one that was not:
 * at worst that of the plan it all began with, which the server has checked.
 */
export function useEstimate(
  plan: Plan,
  initial: Plan,
): { estimate: Estimate; impossible: boolean } {
  const last = useRef<Estimate | null>(null);
  return useMemo(() => {
    try {
      last.current = estimateOf(plan);
      return { estimate: last.current, impossible: false };
    } catch (error) {
      if (!(error instanceof DomainError)) throw error;
      return { estimate: last.current ?? estimateOf(initial), impossible: true };
    }
  }, [plan, initial]);
}

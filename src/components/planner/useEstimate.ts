import { useMemo, useRef } from 'react';
import { DomainError } from '../../lib/errors';
import { estimate as estimateOf } from '../../lib/ledger/estimate';
import type { Estimate } from '../../lib/ledger/ledger';
import { EXAMPLE_PLAN } from '../../lib/plan/examplePlan';
import type { Plan } from '../../lib/plan/plan';

/** The estimate of a plan; while the plan is out of the model's domain, the last one that was not. */
export function useEstimate(plan: Plan): { estimate: Estimate; impossible: boolean } {
  const last = useRef<Estimate | null>(null);
  return useMemo(() => {
    try {
      last.current = estimateOf(plan);
      return { estimate: last.current, impossible: false };
    } catch (error) {
      if (!(error instanceof DomainError)) throw error;
      return { estimate: last.current ?? estimateOf(EXAMPLE_PLAN), impossible: true };
    }
  }, [plan]);
}

import { useEffect, useState } from 'react';
import type { Plan } from '../../lib/plan/plan';
import { storedPlan, storePlan } from './planStorage';
import type { PlanEditing } from './usePlan';

/**
 * Keeps the plan on this device while it differs from the example, and brings it back on the next
 * visit. Says whether the plan on the screen is one's own.
 */
export function useStoredPlan(
  { plan, change }: PlanEditing,
  example: Plan,
  asked: boolean,
): boolean {
  const [ready, setReady] = useState(asked);
  useEffect(() => {
    if (ready) return;
    let gone = false;
    void storedPlan().then((stored) => {
      if (gone) return;
      if (stored) change(() => stored, 'brought back');
      setReady(true);
    });
    return () => {
      gone = true;
    };
  }, [ready, change]);

  const own = JSON.stringify(plan) !== JSON.stringify(example);
  useEffect(() => {
    if (ready) storePlan(own ? plan : null);
  }, [ready, own, plan]);
  return own;
}

import { useEffect, useState } from 'react';
import type { Plan } from '../../lib/plan/plan';
import type { PlanEditing } from './usePlan';

const KEY = 'ellwise.plan';

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
    if (!ready) return;
    try {
      if (own) localStorage.setItem(KEY, JSON.stringify(plan));
      else localStorage.removeItem(KEY);
    } catch {
      // A browser without storage (private mode, full disk) still estimates; it only cannot remember.
    }
  }, [ready, own, plan]);
  return own;
}

/** What is stored may be of an older edition or edited by hand: it is checked like any stranger's plan. */
async function storedPlan(): Promise<Plan | null> {
  try {
    const text = localStorage.getItem(KEY);
    if (!text) return null;
    const { planSchema } = await import('../../schemas/plan');
    const parsed = planSchema.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

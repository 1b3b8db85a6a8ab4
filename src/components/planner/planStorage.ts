import type { Plan } from '../../lib/plan/plan';

const KEY = 'ellwise.plan';

/**
 * The plan kept on this device, or null. It may be of an older edition or edited by hand: it is
 * checked like any stranger's plan.
 */
export async function storedPlan(): Promise<Plan | null> {
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

/** Keeps a plan on this device, or forgets it; says whether the browser could. */
export function storePlan(plan: Plan | null): boolean {
  try {
    if (plan) localStorage.setItem(KEY, JSON.stringify(plan));
    else localStorage.removeItem(KEY);
    return true;
  } catch {
    // A browser without storage (private mode, full disk) still estimates; it only cannot remember.
    return false;
  }
}

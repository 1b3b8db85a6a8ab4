import type { PlanSwatch } from '../../lib/plan/plan';

/** A hand that joins are compared for; without a swatch the plan's own, all its evidence included. */
export interface Tension {
  readonly id: string;
  readonly name: string;
  readonly swatch: PlanSwatch | null;
}

export const OWN_TENSION: Tension = { id: 'plan', name: 'This plan', swatch: null };

/** Hands side by side that a table and a chart still show well. */
export const MOST_TENSIONS = 6;

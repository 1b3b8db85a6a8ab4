import { layoutFor } from '../../../lib/layout/layouts';
import { EXAMPLE_PLAN } from '../../../lib/plan/examplePlan';
import { withMotif } from '../../../lib/plan/edits';
import { motifOf } from '../../../lib/pattern/motifOf';
import type { Reading } from '../../../lib/pattern/reading';
import { storedPlan, storePlan } from '../../planner/planStorage';

/** Key of a motif that has only been read and not kept. */
const READ_KEY = 'read-pattern';

/** Why a blanket cannot be planned of this motif, or null when it can. */
export function noPlanBecause({ rounds, sides }: Reading): string | null {
  if (rounds.length === 0) return 'There are no rounds yet.';
  if (rounds[0]?.kind === 'row') return 'A piece worked in rows is no motif to join.';
  return layoutFor(sides) === null ? 'There is no layout for motifs of this shape yet.' : null;
}

/**
 * Puts the motif into the plan kept on this device, or into the example, for the estimator to open.
 * Answers with what went wrong, in words, or null.
 */
export async function planMotif(reading: Reading, name: string): Promise<string | null> {
  const motif = motifOf(reading, READ_KEY, name.trim() || 'My motif');
  const plan = withMotif((await storedPlan()) ?? EXAMPLE_PLAN, motif);
  const { planSchema } = await import('../../../schemas/plan');
  const checked = planSchema.safeParse(JSON.parse(JSON.stringify(plan)));
  if (!checked.success) return checked.error.issues[0]?.message ?? 'The motif cannot be planned.';
  return storePlan(checked.data)
    ? null
    : 'This browser keeps nothing, so the plan cannot be handed on.';
}

import { EXAMPLE_PLAN } from '../../../lib/plan/examplePlan';
import { withMotif } from '../../../lib/plan/edits';
import { withMadeMotif, type MadeMotif } from '../../../lib/plan/madeMotif';
import { motifOf } from '../../../lib/pattern/motifOf';
import type { Reading } from '../../../lib/pattern/reading';
import { workedTo } from '../../motifs/motifWords';
import { storedPlan, storePlan } from '../../planner/planStorage';

/** Why a blanket cannot be planned of this motif, or null when it can. */
export function noPlanBecause({ rounds }: Reading): string | null {
  if (rounds.length === 0) return 'There are no rounds yet.';
  if (rounds[0]?.kind === 'row') return 'A piece worked in rows is no motif to join.';
  return null;
}

/** Which motif a reading is, for the plan that takes it. */
export interface MotifIdentity {
  key: string;
  version: number | null;
}

/** A motif that has only been read and not kept. */
export const READ_ONLY_ONCE: MotifIdentity = { key: 'read-pattern', version: null };

/**
 * Puts the motif, with what making it told, into the plan kept on this device, or into the example, for
 * the estimator to open. Answers with what went wrong, in words, or null.
 */
export async function planMotif(
  reading: Reading,
  name: string,
  { key, version }: MotifIdentity,
  made: MadeMotif | null,
): Promise<string | null> {
  const motif = { ...motifOf(reading, key, name.trim() || 'My motif'), version };
  const old = (await storedPlan()) ?? EXAMPLE_PLAN;
  const plan = made
    ? withMadeMotif(old, workedTo(motif, made.rounds), made)
    : withMotif(old, motif);
  const { planSchema } = await import('../../../schemas/plan');
  const checked = planSchema.safeParse(JSON.parse(JSON.stringify(plan)));
  if (!checked.success) return checked.error.issues[0]?.message ?? 'The motif cannot be planned.';
  return storePlan(checked.data)
    ? null
    : 'This browser keeps nothing, so the plan cannot be handed on.';
}

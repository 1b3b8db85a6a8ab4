import { useState } from 'react';
import type { MadeMotif } from '../../../lib/plan/madeMotif';
import type { Reading } from '../../../lib/pattern/reading';
import { noPlanBecause, planMotif, type MotifIdentity } from './planMotif';

export interface Planning {
  /** Why no blanket can be planned of it, or null. */
  why: string | null;
  /** What went wrong with the last try, or null. */
  problem: string | null;
  /** With what a motif that was made has told, if it was measured. */
  plan: (made?: MadeMotif) => void;
}

/** Hands the motif that was read to the estimator of the front page, and goes there. */
export function usePlanning(reading: Reading, name: string, motif: MotifIdentity): Planning {
  const [problem, setProblem] = useState<string | null>(null);
  const why = noPlanBecause(reading);
  async function plan(made: MadeMotif | null) {
    const wrong = await planMotif(reading, name, motif, made);
    setProblem(wrong);
    if (wrong === null) location.assign('/');
  }
  return { why, problem, plan: (made) => (why === null ? void plan(made ?? null) : undefined) };
}

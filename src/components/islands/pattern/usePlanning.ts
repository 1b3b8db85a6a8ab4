import { useState } from 'react';
import type { Reading } from '../../../lib/pattern/reading';
import { noPlanBecause, planMotif, type MotifIdentity } from './planMotif';

export interface Planning {
  /** Why no blanket can be planned of it, or null. */
  why: string | null;
  /** What went wrong with the last try, or null. */
  problem: string | null;
  plan: () => void;
}

/** Hands the motif that was read to the estimator of the front page, and goes there. */
export function usePlanning(reading: Reading, name: string, motif: MotifIdentity): Planning {
  const [problem, setProblem] = useState<string | null>(null);
  const why = noPlanBecause(reading);
  async function plan() {
    const wrong = await planMotif(reading, name, motif);
    setProblem(wrong);
    if (wrong === null) location.assign('/');
  }
  return { why, problem, plan: () => (why === null ? void plan() : undefined) };
}

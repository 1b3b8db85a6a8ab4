import { useState } from 'react';
import { withMotif } from '../../lib/plan/edits';
import type { ChangePlan } from './usePlan';

interface ReadyMotifChoice {
  /** Puts a ready-made motif, worked to so many rounds, in place of the plan's. */
  readonly choose: (key: string, rounds: number) => void;
  readonly failed: boolean;
}

/** Ready-made motifs are written patterns: they and their reader are fetched when one is chosen. */
export function useReadyMotif(change: ChangePlan): ReadyMotifChoice {
  const [failed, setFailed] = useState(false);
  async function fetchAndUse(key: string, rounds: number) {
    try {
      const { readyMotif } = await import('../../lib/motifs/readyMotifs');
      const motif = readyMotif(key, rounds);
      if (motif) change((old) => withMotif(old, motif));
      setFailed(!motif);
    } catch {
      setFailed(true);
    }
  }
  return { choose: (key, rounds) => void fetchAndUse(key, rounds), failed };
}

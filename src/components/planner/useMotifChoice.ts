import { useState } from 'react';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import type { Motif } from '../../lib/motifs/motif';
import { withMotif } from '../../lib/plan/edits';
import type { ChangePlan } from './usePlan';

interface ChoosingMotif {
  /** Puts a motif, worked to so many rounds, in place of the plan's. */
  readonly choose: (choice: MotifChoice, rounds: number) => void;
  readonly failed: boolean;
}

/** Motifs and what reads them are fetched when one is chosen: the ready-made from the library, one's own from the account. */
export function useMotifChoice(change: ChangePlan, put = withMotif): ChoosingMotif {
  const [failed, setFailed] = useState(false);
  async function fetchAndUse(choice: MotifChoice, rounds: number) {
    try {
      const motif = await fetchMotif(choice);
      if (motif) {
        change((old) => put(old, { ...motif, rounds: motif.rounds.slice(0, rounds) }));
      }
      setFailed(!motif);
    } catch {
      setFailed(true);
    }
  }
  return { choose: (choice, rounds) => void fetchAndUse(choice, rounds), failed };
}

async function fetchMotif({ key, version }: MotifChoice): Promise<Motif | null> {
  if (version === null) {
    const { readyMotif } = await import('../../lib/motifs/readyMotifs');
    return readyMotif(key);
  }
  const { getMotif } = await import('../../client/queries/motifs');
  return (await getMotif(key)).motif;
}

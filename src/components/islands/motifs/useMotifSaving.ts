import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { motifVersionsQuery, restoreMotif, updateMotif } from '../../../client/queries/motifs';
import type { MotifInput, PresentedMotif } from '../../../schemas/motif';
import { conflictOf, failureWords } from '../form/formErrors';

/** Saves a motif of one's own, each time as its next version; one saved elsewhere meanwhile is not overwritten unasked. */
export function useMotifSaving(initial: PresentedMotif) {
  const client = useQueryClient();
  const [kept, setKept] = useState(initial);
  const [conflict, setConflict] = useState<PresentedMotif | null>(null);
  const version = kept.version ?? 1;

  function settle(saved: PresentedMotif) {
    setKept(saved);
    setConflict(null);
    void client.invalidateQueries({ queryKey: motifVersionsQuery(saved.key).queryKey });
  }
  const onError = (error: unknown) => setConflict(conflictOf<PresentedMotif>(error));
  const saving = useMutation({
    mutationFn: ({ motif, over }: { motif: MotifInput; over: number }) =>
      updateMotif(kept.key, over, motif),
    onSuccess: settle,
    onError,
  });
  const restoring = useMutation({
    mutationFn: (from: number) => restoreMotif(kept.key, from, version),
    onSuccess: settle,
    onError,
  });
  const error = saving.error ?? restoring.error;
  return {
    kept,
    version,
    conflict,
    isBusy: saving.isPending || restoring.isPending,
    failure: error && !conflict ? failureWords(error) : null,
    /** On top of the newest save there is, also of one that came in between once the person has seen it. */
    save: (motif: MotifInput, onSaved: OnSaved) =>
      saving.mutate({ motif, over: conflict?.version ?? version }, { onSuccess: onSaved }),
    restore: (from: number, onSaved: OnSaved) => restoring.mutate(from, { onSuccess: onSaved }),
    takeTheirs: () => conflict && settle(conflict),
    forgetConflict: () => setConflict(null),
  };
}

type OnSaved = (saved: PresentedMotif) => void;

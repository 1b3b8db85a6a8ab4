import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { createSwatch, swatchContent, updateSwatch } from '../../../client/queries/swatches';
import { swatchInput, type PresentedSwatch, type SwatchInput } from '../../../schemas/swatch';
import type { SaveState } from '../../ui/SaveStatus';
import { conflictOf, failureWords, placeApiErrors } from '../form/formErrors';
import { useLeaveWarning } from '../form/useLeaveWarning';

interface Conflict {
  yours: SwatchInput;
  theirs: PresentedSwatch;
}

/** A swatch being written: its form, its saving, and the conflict with another save if there is one. */
export function useSwatchForm(initial: PresentedSwatch | null, blank: SwatchInput) {
  const [saved, setSaved] = useState(initial);
  const [conflict, setConflict] = useState<Conflict | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const form = useForm<SwatchInput>({
    resolver: zodResolver(swatchInput),
    defaultValues: initial ? swatchContent(initial) : blank,
    shouldFocusError: false,
  });
  const { isDirty } = form.formState;

  const saving = useMutation({
    mutationFn: ({ values, version }: { values: SwatchInput; version?: number }) =>
      saved ? updateSwatch(saved.id, version ?? saved.version, values) : createSwatch(values),
  });

  function take(swatch: PresentedSwatch) {
    setSaved(swatch);
    setConflict(null);
    form.reset(swatchContent(swatch));
  }

  async function save(values: SwatchInput, version?: number) {
    setFailure(null);
    try {
      const kept = await saving.mutateAsync({ values, version });
      take(kept);
      // The address of a new swatch exists only now; what follows begins there.
      if (!saved) window.location.replace(`/swatches/${kept.id}`);
    } catch (error) {
      const theirs = conflictOf<PresentedSwatch>(error);
      if (theirs) setConflict({ yours: values, theirs });
      else if (!placeApiErrors(error, form.setError)) setFailure(failureWords(error));
    }
  }

  useLeaveWarning(isDirty && !saving.isSuccess);
  return {
    form,
    saved,
    state: stateOf(saving.isPending, failure, isDirty || !saved),
    isSaving: saving.isPending,
    submit: form.handleSubmit((values) => save(values)),
    conflict,
    keepYours: () => conflict && save(conflict.yours, conflict.theirs.version),
    takeTheirs: () => conflict && take(conflict.theirs),
    closeConflict: () => setConflict(null),
  };
}

function stateOf(isSaving: boolean, failure: string | null, isUnsaved: boolean): SaveState {
  if (isSaving) return { is: 'saving' };
  if (failure) return { is: 'failed', why: failure };
  return { is: isUnsaved ? 'unsaved' : 'saved' };
}

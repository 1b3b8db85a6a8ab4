import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { createLot } from '../../../client/queries/stash';
import { createColourway, createYarn } from '../../../client/queries/yarns';
import { stashEntrySchema, type StashEntry } from '../../../schemas/stashEntry';
import { failureWords, placeApiErrors } from '../form/formErrors';

interface StashEntryOptions {
  initial: StashEntry;
  onSaved: () => void;
  /** Some of it was kept: the lists on the page are old. */
  onChange: () => void;
}

/** A new lot being written, with its yarn and colour where those are new too. */
export function useStashEntry({ initial, onSaved, onChange }: StashEntryOptions) {
  const [failure, setFailure] = useState<string | null>(null);
  const form = useForm<StashEntry>({
    resolver: zodResolver(stashEntrySchema),
    defaultValues: initial,
    shouldFocusError: false,
  });
  const { setValue, setError } = form;

  /** What was made stays made: trying again after a refusal goes on from there. */
  async function save(entry: StashEntry) {
    setFailure(null);
    let part: 'yarn' | 'colour' | 'lot' = 'yarn';
    try {
      const yarnId = entry.yarn ? (await createYarn(entry.yarn)).id : entry.yarnId;
      setValue('yarnId', yarnId);
      setValue('yarn', null);
      part = 'colour';
      const colourwayId = entry.colour
        ? (await createColourway(yarnId, entry.colour)).id
        : entry.colourwayId;
      setValue('colourwayId', colourwayId);
      setValue('colour', null);
      part = 'lot';
      await createLot(colourwayId, entry.lot);
      onSaved();
    } catch (error) {
      if (!placeApiErrors(error, setError, part)) setFailure(failureWords(error));
    } finally {
      onChange();
    }
  }

  const saving = useMutation({ mutationFn: save });
  return {
    form,
    failure,
    isSaving: saving.isPending,
    submit: form.handleSubmit((entry) => saving.mutateAsync(entry)),
  };
}

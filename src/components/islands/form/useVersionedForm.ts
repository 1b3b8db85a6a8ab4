import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm, type DefaultValues, type FieldValues } from 'react-hook-form';
import type { FormSchema } from '../../../schemas/schema';
import type { SaveState } from '../../ui/SaveStatus';
import { conflictOf, failureWords, placeApiErrors } from './formErrors';
import { useLeaveWarning } from './useLeaveWarning';

interface VersionedFormOptions<Values extends FieldValues, Row extends { version: number }> {
  schema: FormSchema<Values>;
  /** What is kept, or null for something new. */
  initial: Row | null;
  blank: Values;
  /** The part of a kept row that the form holds. */
  valuesOf: (row: Row) => Values;
  /** Creates it without a row, else changes that row from the version given. */
  save: (values: Values, from: Row | null) => Promise<Row>;
  onSaved?: (row: Row, wasNew: boolean) => void;
  /** Where the route's own fields stand in the form: "lot". */
  prefix?: string;
}

interface Conflict<Values, Row> {
  yours: Values;
  theirs: Row;
}

/**
 * A form over one kept row: checked by a schema, saved from the version it began with, and told
 * both versions when somebody else saved in between.
 */
export function useVersionedForm<Values extends FieldValues, Row extends { version: number }>(
  options: VersionedFormOptions<Values, Row>,
) {
  const { schema, initial, blank, valuesOf, onSaved, prefix } = options;
  const [saved, setSaved] = useState(initial);
  const [conflict, setConflict] = useState<Conflict<Values, Row> | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const form = useForm<Values>({
    resolver: zodResolver(schema),
    defaultValues: (initial ? valuesOf(initial) : blank) as DefaultValues<Values>,
    shouldFocusError: false,
  });
  const { isDirty } = form.formState;
  const saving = useMutation({
    mutationFn: ({ values, from }: { values: Values; from: Row | null }) =>
      options.save(values, from),
  });

  function take(row: Row) {
    setSaved(row);
    setConflict(null);
    form.reset(valuesOf(row));
  }

  async function save(values: Values, from: Row | null) {
    setFailure(null);
    try {
      const row = await saving.mutateAsync({ values, from });
      take(row);
      onSaved?.(row, from === null);
    } catch (error) {
      const theirs = conflictOf<Row>(error);
      if (theirs) setConflict({ yours: values, theirs });
      else if (!placeApiErrors(error, form.setError, prefix)) setFailure(failureWords(error));
    }
  }

  useLeaveWarning(isDirty && !saving.isSuccess);
  return {
    form,
    saved,
    state: stateOf(saving.isPending, failure, isDirty || !saved),
    isSaving: saving.isPending,
    submit: form.handleSubmit((values) => save(values, saved)),
    conflict,
    keepYours: () => conflict && save(conflict.yours, conflict.theirs),
    takeTheirs: () => conflict && take(conflict.theirs),
    closeConflict: () => setConflict(null),
  };
}

function stateOf(isSaving: boolean, failure: string | null, isUnsaved: boolean): SaveState {
  if (isSaving) return { is: 'saving' };
  if (failure) return { is: 'failed', why: failure };
  return { is: isUnsaved ? 'unsaved' : 'saved' };
}

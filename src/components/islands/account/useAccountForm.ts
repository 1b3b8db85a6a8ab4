import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useForm, type DefaultValues, type FieldPath, type FieldValues } from 'react-hook-form';
import { ApiError } from '../../../client/api';
import type { FormSchema } from '../../../schemas/schema';
import { failureWords, placeApiErrors } from '../form/formErrors';

interface AccountFormOptions<Values extends FieldValues, Result> {
  /** The schema the route parses with. */
  schema: FormSchema<Values>;
  defaultValues: DefaultValues<Values>;
  send: (values: Values) => Promise<Result>;
  onSent?: (result: Result, values: Values) => void;
}

/**
 * A form over one API call: checked by the route's own schema, errors of either side beside their
 * fields, the cursor on the first one. `failure` is what belongs to no field.
 */
export function useAccountForm<Values extends FieldValues, Result>({
  schema,
  defaultValues,
  send,
  onSent,
}: AccountFormOptions<Values, Result>) {
  const form = useForm<Values>({ resolver: zodResolver(schema), defaultValues });
  const errorOf = (name: FieldPath<Values>) =>
    form.getFieldState(name, form.formState).error?.message;

  const mutation = useMutation({
    mutationFn: send,
    onSuccess: onSent,
    onError(error) {
      if (!placeApiErrors(error, form.setError)) return;
      const [first] = Object.keys((error as ApiError).fields);
      form.setFocus(first as FieldPath<Values>);
    },
  });
  const isPlaced = mutation.error instanceof ApiError && mutation.error.code === 'invalid';
  return {
    form,
    errorOf,
    /** Spread over a Field: its registration, and its error. */
    field: (name: FieldPath<Values>) => ({
      ...form.register(name),
      id: name,
      error: errorOf(name),
    }),
    submit: form.handleSubmit((values) => mutation.mutate(values)),
    isBusy: mutation.isPending,
    sent: mutation.isSuccess ? mutation.variables : null,
    result: mutation.data,
    error: mutation.error,
    failure: mutation.error && !isPlaced ? failureWords(mutation.error) : null,
    reset: mutation.reset,
  };
}

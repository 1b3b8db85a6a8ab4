import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { ApiError } from '../../../client/api';
import type { FieldError } from '../../ui/ErrorSummary';

/** Every error of a form with the id of its field, which is its path: "measurements.0.widthMm". */
export function listErrors(errors: object, path = ''): FieldError[] {
  return Object.entries(errors).flatMap(([key, value]: [string, unknown]): FieldError[] => {
    if (typeof value !== 'object' || value === null || key === 'ref') return [];
    const here = path ? `${path}.${key}` : key;
    // A list's own error stands under "root"; its place on the screen is the list's.
    if ('message' in value && typeof value.message === 'string' && 'type' in value) {
      return [{ field: key === 'root' ? path : here, message: value.message }];
    }
    return listErrors(value, here);
  });
}

/**
 * Puts the errors of a refused save beside their fields. True when every part of the answer found
 * a place; false when it has to be said some other way. `prefix` is where the route's own fields
 * stand in the form.
 */
export function placeApiErrors<Values extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<Values>,
  prefix = '',
): boolean {
  if (!(error instanceof ApiError) || error.code !== 'invalid') return false;
  const fields = Object.entries(error.fields);
  for (const [path, message] of fields) {
    setError(`${prefix && `${prefix}.`}${path}` as FieldPath<Values>, { type: 'server', message });
  }
  return fields.length > 0;
}

/** A failure in words, for a notice. */
export const failureWords = (error: unknown): string =>
  error instanceof ApiError ? error.message : 'Something went wrong here. Try again.';

/** What another save says now, when this one came too late. */
export function conflictOf<Row>(error: unknown): Row | null {
  return error instanceof ApiError && error.code === 'conflict' && error.current
    ? (error.current as Row)
    : null;
}

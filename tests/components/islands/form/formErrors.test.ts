import { describe, expect, it, vi } from 'vitest';
import { ApiError } from '../../../../src/client/api';
import {
  conflictOf,
  failureWords,
  listErrors,
  placeApiErrors,
} from '../../../../src/components/islands/form/formErrors';

const invalid = new ApiError(400, {
  code: 'invalid',
  message: 'Some fields are not right.',
  fields: { lotCode: 'Too long', 'partSkeins.0.massG': 'Too heavy' },
});

describe('listErrors', () => {
  it('names every field by its path, also inside lists', () => {
    const errors = {
      name: { type: 'too_small', message: 'Name is missing' },
      measurements: [undefined, { massG: { type: 'custom', message: 'Must be more than 0' } }],
    };
    expect(listErrors(errors)).toEqual([
      { field: 'name', message: 'Name is missing' },
      { field: 'measurements.1.massG', message: 'Must be more than 0' },
    ]);
  });

  it("says a list's own error at the list", () => {
    const errors = { parts: { root: { type: 'too_big', message: 'At most 100' } } };
    expect(listErrors(errors)).toEqual([{ field: 'parts', message: 'At most 100' }]);
  });

  it('has nothing to say of a form in order', () => {
    expect(listErrors({})).toEqual([]);
  });
});

describe('placeApiErrors', () => {
  it('puts each message at its field, under the part of the form that was sent', () => {
    const setError = vi.fn();
    expect(placeApiErrors(invalid, setError, 'lot')).toBe(true);
    expect(setError.mock.calls).toEqual([
      ['lot.lotCode', { type: 'server', message: 'Too long' }],
      ['lot.partSkeins.0.massG', { type: 'server', message: 'Too heavy' }],
    ]);
  });

  it('leaves every other failure to be said some other way', () => {
    const setError = vi.fn();
    expect(placeApiErrors(new Error('no network'), setError)).toBe(false);
    expect(setError).not.toHaveBeenCalled();
  });
});

describe('conflictOf', () => {
  it('hands back the row as it is now', () => {
    const current = { version: 3 };
    const late = new ApiError(409, { code: 'conflict', message: 'Saved elsewhere', current });
    expect(conflictOf(late)).toBe(current);
  });

  it('is nothing for another failure', () => {
    expect(conflictOf(invalid)).toBeNull();
  });
});

describe('failureWords', () => {
  it("uses the answer's own words and tells nothing of an unknown error", () => {
    expect(failureWords(invalid)).toBe('Some fields are not right.');
    expect(failureWords(new Error('secret'))).not.toContain('secret');
  });
});

import { describe, expect, it } from 'vitest';
import { hex, line, listQuery, notes, uuid } from '../../src/schemas/fields';
import { fieldErrors } from '../../src/schemas/schema';

const messageOf = (schema: { safeParse: (value: unknown) => never }, value: unknown) => {
  const result = schema.safeParse(value) as { success: boolean; error: never };
  return result.success ? null : fieldErrors(result.error)[''];
};

describe('text', () => {
  it('keeps lines in notes and refuses them in a name', () => {
    expect(notes('Notes', 100).parse('one\ntwo\tthree')).toBe('one\ntwo\tthree');
    expect(messageOf(line('Place', 100) as never, 'one\ntwo')).toBe(
      'Place must not contain control characters',
    );
    expect(messageOf(notes('Notes', 100) as never, 'one\u0000')).toBe(
      'Notes must not contain control characters',
    );
  });
});

describe('hex', () => {
  it('is written in small letters', () => {
    expect(hex.parse('#2F6F6B')).toBe('#2f6f6b');
  });
});

describe('uuid', () => {
  it('refuses what PostgreSQL would refuse', () => {
    expect(messageOf(uuid as never, "1' or true")).toBe('This is not the id of anything kept here');
  });
});

describe('listQuery', () => {
  it('is a hundred rows from the first when nothing is asked', () => {
    expect(listQuery.parse({})).toEqual({ limit: 100, offset: 0 });
    expect(listQuery.parse({ limit: '20', offset: '40' })).toEqual({ limit: 20, offset: 40 });
  });

  it.each([
    [{ limit: '' }, 'limit must be a whole number'],
    [{ limit: '-1' }, 'limit must be a whole number'],
    [{ limit: '0' }, 'limit must be at least 1'],
    [{ limit: '501' }, 'limit must be at most 500'],
    [{ limit: '999999999999' }, 'limit must be a whole number'],
  ])('refuses %j', (query, message) => {
    const result = listQuery.safeParse(query);
    expect(fieldErrors(result.error!)).toEqual({ limit: message });
  });
});

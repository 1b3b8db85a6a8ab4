import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hex, line, listQuery, notes, numberFromText, uuid } from '../../src/schemas/fields';
import { fieldErrors } from '../../src/schemas/schema';

const messageOf = (schema: { safeParse: (value: unknown) => never }, value: unknown) => {
  const result = schema.safeParse(value) as { success: boolean; error: never };
  return result.success ? null : fieldErrors(result.error)[''];
};

describe('numberFromText', () => {
  it.each([
    ['12', 12],
    [' 12.5 ', 12.5],
    ['12,5', 12.5],
    ['0,125', 0.125],
    ['1000', 1000],
    ['-3', -3],
    ['.5', 0.5],
    ['5.', 5],
  ])('reads "%s"', (text, value) => {
    expect(numberFromText.parse(text)).toBe(value);
  });

  it.each([
    ['', 'Write a number'],
    ['   ', 'Write a number'],
    ['1,500', 'Write 1500 or 1.500: the comma could mean either'],
    ['1e3', 'Write a number, such as 12.5'],
    ['twelve', 'Write a number, such as 12.5'],
    ['1.2.3', 'Write a number, such as 12.5'],
    ['Infinity', 'Write a number, such as 12.5'],
  ])('does not read "%s"', (text, message) => {
    expect(messageOf(numberFromText as never, text)).toBe(message);
  });

  it('comes back from the text it is written as', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e6, max: 1e6 }), (thousandths) => {
        const value = thousandths / 1000;
        expect(numberFromText.decode(numberFromText.encode(value))).toBe(value);
      }),
      { seed: 20261201 },
    );
  });
});

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

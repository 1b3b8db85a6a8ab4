import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberFromText } from '../../../src/lib/units/numberFromText';
import { FIXED_SEED } from '../../support/plans';

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
    expect(numberFromText(text)).toEqual({ ok: true, value });
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
    expect(numberFromText(text)).toEqual({ ok: false, error: message });
  });

  it('comes back from the text it is written as', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e6, max: 1e6 }), (thousandths) => {
        const value = thousandths / 1000;
        expect(numberFromText(String(value))).toEqual({ ok: true, value });
      }),
      FIXED_SEED,
    );
  });
});

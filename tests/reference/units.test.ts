import { unit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import {
  GRAMS_PER_OUNCE,
  GRAMS_PER_POUND,
  METRES_PER_YARD,
  MM_PER_INCH,
} from '../../src/lib/units/conversion';
import { referenceRows } from '../support/reference';

const ours: Record<string, number> = {
  yard: METRES_PER_YARD,
  inch: MM_PER_INCH,
  pound: GRAMS_PER_POUND,
  ounce: GRAMS_PER_OUNCE,
};

describe('unit constants', () => {
  it.each(referenceRows<'unit' | 'of' | 'value'>('units.csv'))(
    'hold $value $of to a $unit exactly', // NIST Handbook 44, appendix C
    ({ unit: name, value }) => expect(ours[name]).toBe(Number(value)),
  );

  it.each([
    ['yard', 'm'],
    ['inch', 'mm'],
    ['lbm', 'g'],
  ])('agree with mathjs on a %s in %s', (name, of) => {
    const value = ours[name === 'lbm' ? 'pound' : name] as number;
    expect(Math.abs(unit(1, name).toNumber(of) / value - 1)).toBeLessThan(1e-14);
  });

  it('agree with mathjs on an ounce, which it rounds to nine digits', () => {
    expect(Math.abs(unit(1, 'oz').toNumber('g') / GRAMS_PER_OUNCE - 1)).toBeLessThan(1e-8);
  });
});

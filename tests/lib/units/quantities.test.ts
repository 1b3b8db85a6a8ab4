import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import {
  durationS,
  lengthM,
  massG,
  priceMinor,
  QUANTITY_LIMITS,
  widthMm,
} from '../../../src/lib/units/quantities';

const constructors = { lengthM, widthMm, massG, durationS, priceMinor };

describe.each(Object.entries(constructors))('%s', (name, make) => {
  const most = QUANTITY_LIMITS[name as keyof typeof QUANTITY_LIMITS];

  it('gives back the number it was given, from 0 to its limit', () => {
    for (const value of [0, 1, 200, most]) expect(make(value)).toBe(value);
  });

  it.each([-1, -1e-12, NaN, Infinity, -Infinity, most + 1])('refuses %s', (value) => {
    expect(() => make(value)).toThrow(DomainError);
  });
});

describe('priceMinor', () => {
  it('refuses a part of a minor unit, saying so', () => {
    expect(() => priceMinor(6.5)).toThrow('priceMinor requires whole minor units, got 6.5');
    expect(() => priceMinor(NaN)).toThrow('priceMinor requires whole minor units, got NaN');
  });
});

describe('an error of a quantity', () => {
  it('has a code for programs and names function, range and value for people', () => {
    try {
      lengthM(-3);
      expect.unreachable();
    } catch (error) {
      expect(error).toBeInstanceOf(DomainError);
      expect((error as DomainError).code).toBe('quantity-out-of-range');
      expect((error as DomainError).message).toBe(
        'lengthM requires a number from 0 to 10000000, got -3',
      );
    }
  });
});

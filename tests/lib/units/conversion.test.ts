import { describe, expect, it } from 'vitest';
import {
  GAUGE_SPAN_MM,
  GRAMS_PER_OUNCE,
  gramsToOunces,
  inchesToMm,
  metresToYards,
  METRES_PER_YARD,
  MM_PER_INCH,
  mmToInches,
  ouncesToGrams,
  yardsToMetres,
} from '../../../src/lib/units/conversion';

describe('conversion', () => {
  it('gives the worked examples of its functions', () => {
    expect(metresToYards(0.9144)).toBe(1);
    expect(yardsToMetres(219)).toBeCloseTo(200.2536, 10); // by hand: 219 × 0.9144
    expect(mmToInches(25.4)).toBe(1);
    expect(inchesToMm(4)).toBe(101.6);
    expect(gramsToOunces(28.349523125)).toBe(1);
    expect(ouncesToGrams(3.5)).toBeCloseTo(99.223, 3); // by hand: 3.5 × 28.349523125 = 99.22333
  });

  it('derives one constant from another without losing a digit', () => {
    expect(MM_PER_INCH).toBe(25.4);
    expect(MM_PER_INCH * 36).toBeCloseTo(METRES_PER_YARD * 1000, 12);
    expect(GRAMS_PER_OUNCE).toBe(28.349523125);
    expect(GAUGE_SPAN_MM).toBe(101.6);
  });

  it.each([
    ['metres and yards', metresToYards, yardsToMetres],
    ['millimetres and inches', mmToInches, inchesToMm],
    ['grams and ounces', gramsToOunces, ouncesToGrams],
  ])('turns %s into one another and back', (_, there, back) => {
    for (const value of [0, 1e-9, 1, 142, 1e7]) {
      expect(Math.abs(back(there(value)) - value)).toBeLessThanOrEqual(1e-15 * value);
    }
  });
});

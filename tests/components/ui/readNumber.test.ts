import { describe, expect, it } from 'vitest';
import { readNumber, stepNumber } from '../../../src/components/ui/readNumber';

describe('readNumber', () => {
  it.each([
    ['12.5', 12.5],
    [' 12,5 ', 12.5],
    ['0', 0],
    ['.5', 0.5],
    ['1500', 1500],
  ])('reads %j as %d', (typed, value) => {
    expect(readNumber(typed)).toEqual({ ok: true, value });
  });

  it('takes an empty field for missing, never for 0', () => {
    expect(readNumber('  ')).toEqual({ ok: false, error: 'Write a number' });
  });

  it('takes an empty field for "not known" where that is an answer', () => {
    expect(readNumber('', { optional: true })).toEqual({ ok: true, value: null });
  });

  it.each(['abc', '12 cm', '1e3', '--3', 'NaN', 'Infinity'])('refuses %j in words', (typed) => {
    expect(readNumber(typed)).toMatchObject({ ok: false, error: expect.stringContaining('Write') });
  });

  it('says the limit and its unit', () => {
    expect(readNumber('0', { min: 1, unit: 'g' })).toEqual({ ok: false, error: 'At least 1 g' });
    expect(readNumber('20000', { max: 10_000, unit: 'g' })).toEqual({
      ok: false,
      error: 'At most 10,000 g',
    });
  });

  it('refuses part of a stitch', () => {
    expect(readNumber('7.5', { whole: true })).toEqual({
      ok: false,
      error: 'Write a whole number',
    });
  });
});

describe('stepNumber', () => {
  it.each([
    [12.4, 1, 1, 13],
    [12.4, -1, 1, 12],
    [13, 1, 1, 14],
    [13, -1, 1, 12],
    // 0.3 is not three times 0.1 in binary; the step must not stand still there.
    [0.3, 1, 0.1, 0.4],
    [0.3, -1, 0.1, 0.2],
  ] as const)('goes from %d by %d steps of %d to %d', (value, direction, step, next) => {
    expect(stepNumber(value, direction, step, {})).toBe(next);
  });

  it('stops at the limits', () => {
    expect(stepNumber(1, -1, 1, { min: 1 })).toBe(1);
    expect(stepNumber(9.5, 1, 1, { max: 9.6 })).toBe(9.6);
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { axisFor, shareOf } from '../../../../src/components/islands/swatches/ranges';

describe('axisFor', () => {
  it('stands on round numbers around its values', () => {
    expect(axisFor([23, 57])).toEqual({ from: 20, to: 60, ticks: [20, 30, 40, 50, 60] });
  });

  it('holds every value, with few ticks', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0.01, max: 1e5, noNaN: true }), { minLength: 1, maxLength: 6 }),
        (values) => {
          const { from, to, ticks } = axisFor(values);
          expect(from).toBeLessThanOrEqual(Math.min(...values));
          expect(to).toBeGreaterThanOrEqual(Math.max(...values));
          expect(ticks.length).toBeLessThanOrEqual(9);
        },
      ),
    );
  });

  it('opens a little room round a single value', () => {
    const { from, to } = axisFor([40]);
    expect(from).toBeLessThan(40);
    expect(to).toBeGreaterThan(40);
  });
});

describe('shareOf', () => {
  it('goes from 0 to 1 along the axis and never beyond', () => {
    const axis = axisFor([23, 57]);
    expect([20, 40, 60, 90].map((value) => shareOf(axis, value))).toEqual([0, 0.5, 1, 1]);
  });
});

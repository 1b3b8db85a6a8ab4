import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { spread } from '../../../src/lib/chart/spread';

const thing = (width = 1, foot: number | null = null) => ({ width, foot });

describe('spread', () => {
  it('stands things of one width evenly between two ends', () => {
    // By symmetry.
    const places = spread([thing(), thing()], { at: 0, width: 0 }, { at: 2, width: 0 });
    expect(places).toEqual([expect.closeTo(0.5, 9), expect.closeTo(1.5, 9)]);
  });

  it('draws a thing towards its foot, but not to it', () => {
    const [place = NaN] = spread([thing(1, 0.8)], { at: 0, width: 1 }, { at: 1, width: 1 });
    expect(place).toBeGreaterThan(0.5);
    expect(place).toBeLessThan(0.8);
  });

  it('keeps the order of things that stand over their feet, whatever their widths', () => {
    const widths = fc.array(fc.double({ min: 0.2, max: 3, noNaN: true }), {
      minLength: 1,
      maxLength: 40,
    });
    fc.assert(
      fc.property(widths, (all) => {
        const things = all.map((width, i) => thing(width, (10 * (i + 1)) / (all.length + 1)));
        const places = spread(things, { at: 0, width: 1 }, { at: 10, width: 1 });
        expect(places).toEqual([...places].sort((a, b) => a - b));
        expect(Math.min(...places)).toBeGreaterThan(0);
        expect(Math.max(...places)).toBeLessThan(10);
      }),
      { seed: 7 },
    );
  });
});

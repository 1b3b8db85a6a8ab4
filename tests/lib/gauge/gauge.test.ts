import { describe, expect, it } from 'vitest';
import { chainLengthMm, gaugeOf } from '../../../src/lib/gauge/gauge';
import { widthMm } from '../../../src/lib/units/quantities';
import { frozen } from '../../support/plans';

const swatch = frozen({
  stitch: 'sc',
  stitches: 20,
  rows: 18,
  widthMm: widthMm(150),
  heightMm: widthMm(124),
});

describe('gaugeOf', () => {
  it('gives its worked example', () => {
    const gauge = gaugeOf(swatch, 4);
    expect(gauge.source).toBe('swatch');
    expect(gauge.stitchWidthMm).toBe(7.5); // 150 / 20
    expect(gauge.heightMm('sc')).toBeCloseTo(6.889, 3); // 124 / 18
  });

  it('scales every other stitch by the factor of the swatch', () => {
    // 6.8889 / (0.92 × 7.5) = 0.99839; dc: 1.85 × 7.5 × 0.99839 = 13.853
    const gauge = gaugeOf(swatch, 4);
    expect(gauge.heightMm('dc')).toBeCloseTo(13.8527, 4);
    expect(gauge.heightMm('dc') / gauge.heightMm('sc')).toBeCloseTo(1.85 / 0.92, 12);
  });

  it('measures a swatch in any stitch: its own height is exactly as measured', () => {
    // 12 dc over 100 mm, 7 rows over 112 mm: 8.333 mm wide, 16 mm tall
    const gauge = gaugeOf(
      { stitch: 'dc', stitches: 12, rows: 7, widthMm: widthMm(100), heightMm: widthMm(112) },
      4,
    );
    expect(gauge.heightMm('dc')).toBeCloseTo(16, 12);
    expect(gauge.heightMm('sc')).toBeCloseTo((16 * 0.92) / 1.85, 12);
  });

  it('falls back on the yarn category', () => {
    const gauge = gaugeOf(null, 4);
    expect(gauge.source).toBe('category');
    expect(gauge.stitchWidthMm).toBeCloseTo(8.128, 12);
    expect(gauge.heightMm('sc')).toBeCloseTo(0.92 * 8.128, 12);
  });

  it('is surest of what was measured and least sure without a swatch', () => {
    const measured = gaugeOf(swatch, 4);
    expect(measured.heightSpread('sc')).toBe(0.03);
    expect(measured.heightSpread('dc')).toBe(0.08);
    expect(gaugeOf(null, 4).heightSpread('sc')).toBeCloseTo(Math.sqrt(0.08 ** 2 + 0.12 ** 2), 12);
  });

  it('throws for the height of a stitch that is not in the table', () => {
    expect(() => gaugeOf(null, 4).heightMm('zz')).toThrow('got "zz"');
    expect(() => gaugeOf({ ...swatch, stitch: 'zz' }, 4)).toThrow('got "zz"');
  });
});

describe('chainLengthMm', () => {
  it('is nine tenths of a stitch width', () => {
    expect(chainLengthMm(gaugeOf(swatch, 4))).toBeCloseTo(6.75, 12);
  });
});

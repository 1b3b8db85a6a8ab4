import { describe, expect, it } from 'vitest';
import { swatchGauge } from '../../../src/lib/swatches/swatchGauge';
import type { SwatchMeasurement, SwatchRecord } from '../../../src/lib/swatches/swatchRecord';

const size = (widthMm: number, heightMm: number, blocked = false): SwatchMeasurement => ({
  kind: 'size',
  widthMm,
  heightMm,
  blocked,
});
const medium = { weightCategory: 4, putUp: { massG: 100, lengthM: 200 } } as const;
const swatch = (measurements: SwatchMeasurement[], more: Partial<SwatchRecord> = {}) =>
  swatchGauge({ stitch: 'sc', stitches: 20, rows: 18, yarn: medium, measurements, ...more });

describe('swatchGauge', () => {
  it('divides the size by the counts', () => {
    const gauge = swatch([size(150, 124)]);
    expect(gauge?.stitchWidth).toEqual({ mean: 7.5, plusMinus: null, count: 1 });
    expect(gauge?.rowHeight.mean).toBeCloseTo(124 / 18, 12);
  });

  it('has no answer before a size is measured', () => {
    expect(swatch([])).toBeNull();
  });

  it('averages several sizes and says how unsure the mean is', () => {
    const gauge = swatch([size(148, 124), size(150, 124), size(152, 124)]);
    expect(gauge?.stitchWidth.mean).toBeCloseTo(7.5, 12);
    // Standard deviation 2 / 20 mm; t(0.975, 2) = 4.303 (NIST/SEMATECH e-Handbook, 1.3.6.7.2).
    expect(gauge?.stitchWidth.plusMinus).toBeCloseTo((4.303 * 0.1) / Math.sqrt(3), 4);
    expect(gauge?.rowHeight.plusMinus).toBe(0);
  });

  it('goes by the blocked size where there is one', () => {
    const gauge = swatch([size(150, 124), size(160, 128, true)]);
    expect(gauge).toMatchObject({ widthMm: 160, heightMm: 128, blocked: true });
  });

  it('finds nothing to question in an ordinary swatch', () => {
    // Medium: 11 to 14 sc in 4 in (Craft Yarn Council), so 7.26 to 9.24 mm a stitch.
    expect(swatch([size(150, 124)])?.questions).toEqual([]);
  });

  it.each([
    // A fifth beyond the range on either side is left alone (ours).
    { widthMm: 20 * 5.81, questions: [] },
    { widthMm: 20 * 5.8, questions: ['width'] },
    { widthMm: 20 * 11.08, questions: [] },
    { widthMm: 20 * 11.1, questions: ['width'] },
  ])('questions a width of $widthMm mm as $questions', ({ widthMm, questions }) => {
    expect(swatch([size(widthMm, widthMm * 0.92 * 0.9)])?.questions).toEqual(questions);
  });

  it('does not question a width when the yarn is not known', () => {
    expect(swatch([size(400, 400 * 0.83)], { yarn: null })?.questions).toEqual([]);
  });

  it('questions rows as tall as another stitch makes them', () => {
    // dc stands 1.85 widths tall, sc 0.92 (trade tables behind the stitch table).
    const counted = swatch([size(150, 18 * 7.5 * 0.92)], { stitch: 'dc' });
    expect(counted?.questions).toEqual(['proportion']);
  });
});

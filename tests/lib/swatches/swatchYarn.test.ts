import { describe, expect, it } from 'vitest';
import type { SwatchMeasurement, SwatchRecord } from '../../../src/lib/swatches/swatchRecord';
import { swatchYarn } from '../../../src/lib/swatches/swatchYarn';

const medium = { weightCategory: 4, putUp: { massG: 100, lengthM: 200 } } as const;
const weighed = (massG: number, resolutionG = 1): SwatchMeasurement => ({
  kind: 'weight',
  massG,
  resolutionG,
});
const unravelled = (lengthM: number, errorM: number): SwatchMeasurement => ({
  kind: 'length',
  lengthM,
  errorM,
});
const learn = (measurements: SwatchMeasurement[], more: Partial<SwatchRecord> = {}) =>
  swatchYarn({ stitch: 'sc', stitches: 20, rows: 18, yarn: medium, measurements, ...more }, 7.5);

describe('swatchYarn', () => {
  it('counts the loops of stitches and chains', () => {
    // 20 × 18 sc of 2 loops, and 21 + 17 chains of 1.
    expect(learn([weighed(15)])?.loops).toBe(758);
  });

  it('reads a weight as a length by the skein, unsure by two readings of the scale', () => {
    const found = learn([weighed(15)]);
    expect(found?.lengthM).toBe(30);
    // Two readings each rounded to 1 g: √(2/12) g at 2 m/g.
    expect(found?.sdM).toBeCloseTo(2 * Math.sqrt(2 / 12), 12);
  });

  it('begins from 5.2 times the stitch width', () => {
    // Published rows, windchilde.com: 5.10 to 5.30 stitch widths of yarn a loop.
    expect(learn([weighed(15)])?.before.meanMm).toBeCloseTo(5.2 * 7.5, 12);
  });

  it('lands near what the swatch took, less its tails', () => {
    const perLoopMm = ((32.8 - 2 * 0.15 * 0.75) * 1000) / 758;
    expect(learn([weighed(16.4, 0.1)])?.after.meanMm).toBeCloseTo(perLoopMm, 0);
  });

  it('is surer after weighing, and surer still with a finer scale', () => {
    const coarse = learn([weighed(15)]);
    const fine = learn([weighed(15, 0.1)]);
    expect(coarse?.after.sdMm).toBeLessThan(coarse?.before.sdMm ?? 0);
    expect(fine?.after.sdMm).toBeLessThan(coarse?.after.sdMm ?? 0);
  });

  it('does not read one piece twice as two pieces', () => {
    // The piece alone, 2 % of the usual 29.8 m over 758 loops, bounds what any number of readings can tell.
    const often = learn(Array.from({ length: 50 }, () => weighed(16.4, 0.1)));
    expect(often?.after.sdMm).toBeGreaterThan(0.95 * ((0.02 * 29.8 * 1000) / 758));
  });

  it('does not mind the order of the readings', () => {
    const there = learn([weighed(16.4, 0.1), unravelled(33, 0.3)]);
    const back = learn([unravelled(33, 0.3), weighed(16.4, 0.1)]);
    expect(there?.after.meanMm).toBeCloseTo(back?.after.meanMm ?? NaN, 12);
  });

  it('leans to the more exact reading', () => {
    const found = learn([weighed(16.4, 0.1), unravelled(40, 4)]);
    expect(found?.lengthM).toBeCloseTo(32.8, 1);
  });

  it('learns from a length without knowing the yarn, but not from a weight', () => {
    expect(learn([unravelled(30, 0.3)], { yarn: null })?.lengthM).toBe(30);
    expect(learn([weighed(15)], { yarn: null })).toBeNull();
  });

  it('has nothing to say before the swatch was weighed or unravelled', () => {
    expect(learn([])).toBeNull();
  });

  it('takes a length said to be without error', () => {
    expect(learn([unravelled(30, 0)])?.lengthM).toBe(30);
  });

  it('questions a swatch that took twice what any hand takes', () => {
    expect(learn([weighed(15)])?.questioned).toBe(false);
    expect(learn([weighed(32)])?.questioned).toBe(true);
  });
});

import { describe, expect, it } from 'vitest';
import { glyphOf } from '../../../src/lib/chart/glyph';
import type { Chart } from '../../../src/lib/chart/layoutChart';
import { overlapsOf } from '../../../src/lib/chart/overlap';
import type { Point } from '../../../src/lib/chart/point';
import { SIZES } from '../../../src/lib/chart/sizes';

const dot = (stitch: number, at: Point) => ({
  ...{ round: 0, stitch, glyph: glyphOf('sl st'), feet: [at], head: at, unitMm: 1 },
});
const chartWith = (...points: Point[]): Chart => ({
  ...{ widthMm: 1, heightMm: 1, originMm: [0, 0], overMm: 0, magicRingMm: null, stitchWidthMm: 1 },
  ring: [],
  rounds: [points.map((at, i) => dot(i, at))],
});

describe('overlapsOf', () => {
  it('finds the share of a box that another covers', () => {
    // Two equal squares, one moved by half its width: they share half of each.
    const [found] = overlapsOf(chartWith([0, 0], [SIZES.dot, 0]), 0.1);
    expect(found?.share).toBeCloseTo(0.5, 9);
  });

  it('says nothing of what lies side by side', () => {
    expect(overlapsOf(chartWith([0, 0], [2.1 * SIZES.dot, 0]), 0)).toEqual([]);
  });

  it('finds a pair across the cells it looks in', () => {
    expect(overlapsOf(chartWith([1.99, 1.99], [2.02, 2.02]), 0.1)).toHaveLength(1);
  });
});

import { describe, expect, it } from 'vitest';
import type { WeightCategory } from '../../src/lib/plan/plan';
import {
  expectedStitchWidthMm,
  stitchWidthRangeMm,
  YARN_CATEGORIES,
} from '../../src/lib/yarnCategories';

const categories: readonly WeightCategory[] = [0, 1, 2, 3, 4, 5, 6, 7];

describe('YARN_CATEGORIES', () => {
  it('stand at their own numbers', () => {
    expect(YARN_CATEGORIES.map(({ category }) => category)).toEqual(categories);
  });
});

describe('expectedStitchWidthMm', () => {
  it('gives its worked example', () => {
    expect(expectedStitchWidthMm(4)).toBeCloseTo(8.128, 12); // 101.6 / 12.5
  });

  it('grows from lace to jumbo', () => {
    const widths = categories.map(expectedStitchWidthMm);
    expect(widths).toEqual(widths.toSorted((left, right) => left - right));
  });
});

describe('stitchWidthRangeMm', () => {
  it('gives its worked example', () => {
    // 101.6 / 14 and 101.6 / 11
    expect(stitchWidthRangeMm(4).map((width) => width.toFixed(2))).toEqual(['7.26', '9.24']);
  });

  it('holds the width to expect of every category', () => {
    for (const category of categories) {
      const [narrowest, widest] = stitchWidthRangeMm(category);
      const expected = expectedStitchWidthMm(category);
      expect(narrowest).toBeLessThan(expected);
      expect(widest).toBeGreaterThan(expected);
    }
  });
});

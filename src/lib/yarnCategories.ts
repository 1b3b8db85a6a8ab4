import type { WeightCategory } from './plan/plan';
import { GAUGE_SPAN_MM } from './units/conversion';

export interface YarnCategory {
  readonly category: WeightCategory;
  readonly name: string;
  /** Stitches in 4 in of the stitch that the category is gauged in: fewest and most. */
  readonly stitchesIn4In: readonly [fewest: number, most: number];
}

/**
 * Yarn weight categories with their published single crochet gauge in 4 in (lace: double crochet).
 * Source: Craft Yarn Council, Standard Yarn Weight System; guidelines, as its publisher says.
 * Super bulky and jumbo differ between editions: 6-9 or 7-9, 5 or 6 and fewer; the wider is here.
 */
export const YARN_CATEGORIES: readonly YarnCategory[] = [
  { category: 0, name: 'Lace', stitchesIn4In: [32, 42] },
  { category: 1, name: 'Super fine', stitchesIn4In: [21, 32] },
  { category: 2, name: 'Fine', stitchesIn4In: [16, 20] },
  { category: 3, name: 'Light', stitchesIn4In: [12, 17] },
  { category: 4, name: 'Medium', stitchesIn4In: [11, 14] },
  { category: 5, name: 'Bulky', stitchesIn4In: [8, 11] },
  { category: 6, name: 'Super bulky', stitchesIn4In: [6, 9] },
  { category: 7, name: 'Jumbo', stitchesIn4In: [4, 6] },
];

/**
 * Stitch width in mm to expect of a category: 4 in over the middle of its gauge.
 * Example: `expectedStitchWidthMm(4)` is 101.6 / 12.5 = 8.128.
 */
export function expectedStitchWidthMm(category: WeightCategory): number {
  const [fewest, most] = gaugeOf(category);
  return GAUGE_SPAN_MM / ((fewest + most) / 2);
}

/** Narrowest and widest stitch in mm of a category: `stitchWidthRangeMm(4)` is 7.26 to 9.24. */
export function stitchWidthRangeMm(category: WeightCategory): readonly [number, number] {
  const [fewest, most] = gaugeOf(category);
  return [GAUGE_SPAN_MM / most, GAUGE_SPAN_MM / fewest];
}

function gaugeOf(category: WeightCategory): readonly [number, number] {
  return (YARN_CATEGORIES[category] as YarnCategory).stitchesIn4In;
}

import type { PlanSwatch } from '../plan/plan';
import { widthMm } from '../units/quantities';
import type { SwatchRecord } from './swatchRecord';
import { swatchSizes } from './swatchSizes';

/** A kept swatch as a plan takes it, at the mean of its sizes; null before it has one. */
export function gaugeSwatch({
  stitch,
  stitches,
  rows,
  measurements,
}: Omit<SwatchRecord, 'yarn'>): PlanSwatch | null {
  const sizes = swatchSizes(measurements);
  if (sizes.length === 0) return null;
  // The means alone: their intervals would bring the t quantile into every page that compares.
  const mean = (of: (size: (typeof sizes)[number]) => number): number =>
    sizes.reduce((sum, size) => sum + of(size), 0) / sizes.length;
  return {
    stitch,
    stitches,
    rows,
    widthMm: widthMm(mean((size) => size.widthMm)),
    heightMm: widthMm(mean((size) => size.heightMm)),
  };
}

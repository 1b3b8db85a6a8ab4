import type { PlanSwatch, WeightCategory } from '../plan/plan';
import type { StitchCode } from '../stitches/stitch';
import { knownStitch } from '../stitches/stitchTable';
import { expectedStitchWidthMm } from '../yarnCategories';

/** Spread of a height over width that was not measured (published tables differ by about this). */
export const UNMEASURED_HEIGHT_SPREAD = 0.08;
/** Spread of a height that was measured on a swatch: ours. */
const MEASURED_HEIGHT_SPREAD = 0.03;
/** Spread of a width taken from the yarn category alone: half its gauge range, roughly; ours. */
export const UNMEASURED_WIDTH_SPREAD = 0.12;

/** Stitch dimensions of one maker's hand in one yarn. */
export interface Gauge {
  readonly stitchWidthMm: number;
  /** Where the width comes from. */
  readonly source: 'swatch' | 'category';
  /** Row height of a stitch in mm. */
  readonly heightMm: (code: StitchCode) => number;
  /** Relative standard deviation of that height as a guess of what this maker makes. */
  readonly heightSpread: (code: StitchCode) => number;
}

/**
 * Gauge from a swatch, or from the yarn category when there is none.
 * The swatch's own stitch gets its measured height; every other stitch is scaled by the factor
 * between that height and the usual proportion.
 *
 * Example: 20 sc over 150 mm and 18 rows over 124 mm: width 7.5 mm, sc 6.89 mm tall.
 */
export function gaugeOf(swatch: PlanSwatch | null, category: WeightCategory): Gauge {
  if (!swatch) {
    const stitchWidthMm = expectedStitchWidthMm(category);
    return {
      stitchWidthMm,
      source: 'category',
      heightMm: (code) => knownStitch(code).heightOverWidth * stitchWidthMm,
      heightSpread: () => Math.hypot(UNMEASURED_HEIGHT_SPREAD, UNMEASURED_WIDTH_SPREAD),
    };
  }
  const stitchWidthMm = swatch.widthMm / swatch.stitches;
  const measuredMm = swatch.heightMm / swatch.rows;
  const factor = measuredMm / (knownStitch(swatch.stitch).heightOverWidth * stitchWidthMm);
  return {
    stitchWidthMm,
    source: 'swatch',
    heightMm: (code) => knownStitch(code).heightOverWidth * stitchWidthMm * factor,
    heightSpread: (code) =>
      code === swatch.stitch ? MEASURED_HEIGHT_SPREAD : UNMEASURED_HEIGHT_SPREAD,
  };
}

/** Length of one chain in mm along a loop: 0.9 of a stitch width (ours). */
export const chainLengthMm = (gauge: Gauge): number => 0.9 * gauge.stitchWidthMm;

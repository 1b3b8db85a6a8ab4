import { GAUGE_TOLERANCE } from '../ledger/notices';
import type { WeightCategory } from '../plan/plan';
import { meanInterval, type MeanInterval } from '../stats/meanInterval';
import { knownStitch } from '../stitches/stitchTable';
import { stitchWidthRangeMm } from '../yarnCategories';
import type { SwatchRecord } from './swatchRecord';
import { swatchSizes } from './swatchSizes';

/** A height over width this far from what its stitch usually has is questioned (ours: three spreads of 8 %). */
const PROPORTION_TOLERANCE = 0.24;

export interface SwatchGauge {
  /** Means over the sizes measured, in mm, each with its interval. */
  readonly stitchWidth: MeanInterval;
  readonly rowHeight: MeanInterval;
  /** Size of the whole swatch, in mm. */
  readonly widthMm: number;
  readonly heightMm: number;
  readonly blocked: boolean;
  /** What the yarn's weight category usually gives, in mm; null while the yarn is not known. */
  readonly usualWidthMm: readonly [narrowest: number, widest: number] | null;
  readonly usualHeightOverWidth: number;
  /** What to question, never to refuse. */
  readonly questions: readonly ('width' | 'proportion')[];
}

/**
 * Stitch width and row height of a swatch, or null before it has a size.
 *
 * Example: 20 sc and 18 rows measured 150 × 124 mm: 7.5 mm wide, 6.889 mm tall, without an interval.
 */
export function swatchGauge(swatch: SwatchRecord): SwatchGauge | null {
  const sizes = swatchSizes(swatch.measurements);
  const stitchWidth = meanInterval(sizes.map(({ widthMm }) => widthMm / swatch.stitches));
  const rowHeight = meanInterval(sizes.map(({ heightMm }) => heightMm / swatch.rows));
  if (!stitchWidth || !rowHeight) return null;
  const usualWidthMm = swatch.yarn && stitchWidthRangeMm(swatch.yarn.weightCategory);
  const usualHeightOverWidth = knownStitch(swatch.stitch).heightOverWidth;
  const proportion = rowHeight.mean / stitchWidth.mean / usualHeightOverWidth;
  return {
    stitchWidth,
    rowHeight,
    widthMm: stitchWidth.mean * swatch.stitches,
    heightMm: rowHeight.mean * swatch.rows,
    blocked: sizes[0]?.blocked ?? false,
    usualWidthMm,
    usualHeightOverWidth,
    questions: [
      ...(swatch.yarn && isUnusualWidth(stitchWidth.mean, swatch.yarn.weightCategory)
        ? (['width'] as const)
        : []),
      ...(Math.abs(proportion - 1) > PROPORTION_TOLERANCE ? (['proportion'] as const) : []),
    ],
  };
}

function isUnusualWidth(widthMm: number, category: WeightCategory): boolean {
  const [narrowest, widest] = stitchWidthRangeMm(category);
  return widthMm < narrowest * (1 - GAUGE_TOLERANCE) || widthMm > widest * (1 + GAUGE_TOLERANCE);
}

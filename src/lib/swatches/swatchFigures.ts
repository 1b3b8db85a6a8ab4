import { swatchGauge } from './swatchGauge';
import type { SwatchRecord } from './swatchRecord';
import { swatchYarn } from './swatchYarn';

/** The headline figures of a swatch, in mm. */
export interface SwatchFigures {
  readonly widthMm: number;
  readonly heightMm: number;
  readonly stitchWidthMm: number;
  readonly rowHeightMm: number;
  /** Yarn in a loop, or null while the swatch was neither weighed nor unravelled. */
  readonly loopMm: number | null;
}

/**
 * What a list says of a swatch, or null before it has a size.
 *
 * Example: 20 sc and 18 rows measured 150 × 124 mm: 7.5 mm wide, 6.889 mm tall.
 */
export function swatchFigures(swatch: SwatchRecord): SwatchFigures | null {
  const gauge = swatchGauge(swatch);
  if (!gauge) return null;
  const { widthMm, heightMm, stitchWidth, rowHeight } = gauge;
  return {
    widthMm,
    heightMm,
    stitchWidthMm: stitchWidth.mean,
    rowHeightMm: rowHeight.mean,
    loopMm: swatchYarn(swatch, stitchWidth.mean)?.after.meanMm ?? null,
  };
}

import type { PlanSwatch } from '../plan/plan';
import { widthMm } from '../units/quantities';
import { swatchGauge } from './swatchGauge';
import type { SwatchRecord } from './swatchRecord';

/** A kept swatch as a plan takes it, at the mean of its sizes; null before it has one. */
export function gaugeSwatch(record: Omit<SwatchRecord, 'yarn'>): PlanSwatch | null {
  const { stitch, stitches, rows, measurements } = record;
  const gauge = swatchGauge({ stitch, stitches, rows, measurements, yarn: null });
  return (
    gauge && {
      stitch,
      stitches,
      rows,
      widthMm: widthMm(gauge.widthMm),
      heightMm: widthMm(gauge.heightMm),
    }
  );
}

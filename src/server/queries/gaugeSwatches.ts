import { swatchGauge } from '../../lib/swatches/swatchGauge';
import type { GaugeSwatch } from '../../lib/swatches/swatchRecord';
import { widthMm } from '../../lib/units/quantities';
import type { CurrentUser } from '../../schemas/user';
import { listSwatches } from './swatches';

/** One's swatches that have a size, as a plan takes them: what a gauge can be chosen from. */
export async function listGaugeSwatches(user: CurrentUser): Promise<GaugeSwatch[]> {
  const { items } = await listSwatches(user);
  return items.flatMap(({ id, name, stitch, stitches, rows, measurements }): GaugeSwatch[] => {
    const gauge = swatchGauge({ stitch, stitches, rows, measurements, yarn: null });
    if (!gauge) return [];
    const size = { widthMm: widthMm(gauge.widthMm), heightMm: widthMm(gauge.heightMm) };
    return [{ id, name, swatch: { stitch, stitches, rows, ...size } }];
  });
}

import { swatchGauge } from '../../lib/swatches/swatchGauge';
import type { GaugeSwatch } from '../../lib/swatches/swatchRecord';
import { widthMm } from '../../lib/units/quantities';
import type { CurrentUser } from '../../schemas/user';
import { listSwatches } from './swatches';
import { listYarnChoices } from './yarnChoices';

/** One's swatches that have a size, as a plan takes them: what a gauge can be chosen from. */
export async function listGaugeSwatches(user: CurrentUser): Promise<GaugeSwatch[]> {
  const [{ items }, yarns] = await Promise.all([listSwatches(user), listYarnChoices(user)]);
  const categories = new Map(yarns.map(({ id, weightCategory }) => [id, weightCategory]));
  return items.flatMap(({ id, name, yarnId, measurements, ...counts }): GaugeSwatch[] => {
    const { stitch, stitches, rows } = counts;
    const gauge = swatchGauge({ stitch, stitches, rows, measurements, yarn: null });
    if (!gauge) return [];
    const size = { widthMm: widthMm(gauge.widthMm), heightMm: widthMm(gauge.heightMm) };
    const weightCategory = categories.get(yarnId ?? '') ?? null;
    return [{ id, name, swatch: { stitch, stitches, rows, ...size }, weightCategory }];
  });
}

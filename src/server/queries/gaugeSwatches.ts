import { gaugeSwatch } from '../../lib/swatches/gaugeSwatch';
import type { GaugeSwatch } from '../../lib/swatches/swatchRecord';
import type { CurrentUser } from '../../schemas/user';
import { listSwatches } from './swatches';
import { listYarnChoices } from './yarnChoices';

/** One's swatches that have a size, as a plan takes them: what a gauge can be chosen from. */
export async function listGaugeSwatches(user: CurrentUser): Promise<GaugeSwatch[]> {
  const [{ items }, yarns] = await Promise.all([listSwatches(user), listYarnChoices(user)]);
  const categories = new Map(yarns.map(({ id, weightCategory }) => [id, weightCategory]));
  return items.flatMap((kept): GaugeSwatch[] => {
    const swatch = gaugeSwatch(kept);
    if (!swatch) return [];
    const weightCategory = categories.get(kept.yarnId ?? '') ?? null;
    return [{ id: kept.id, name: kept.name, swatch, weightCategory }];
  });
}

import type { YarnChoice } from '../../lib/swatches/swatchRecord';
import type { CurrentUser } from '../../schemas/user';
import { listYarns } from './yarns';

/** One's yarns as a form offers them. */
export async function listYarnChoices(user: CurrentUser): Promise<YarnChoice[]> {
  const { items } = await listYarns(user);
  return items.map(({ id, name, weightCategory, putUp, colourways }) => ({
    id,
    name,
    weightCategory,
    putUp,
    hex: colourways[0]?.hex ?? null,
  }));
}

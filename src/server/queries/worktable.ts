import type { BlanketShopping } from '../../schemas/shoppingList';
import type { CurrentUser } from '../../schemas/user';
import type { Worktable } from '../../schemas/worktable';
import { AppError } from '../errors';
import { listBlanketFaces } from './blanketFaces';
import { listBlankets } from './blankets';
import { getBlanketShopping } from './blanketShopping';
import { listStash } from './stash';
import { listSwatches } from './swatches';

const LATEST = 3;

/** The latest of everything, and what each latest blanket is short of. */
export async function getWorktable(user: CurrentUser): Promise<Worktable> {
  const latest = { limit: LATEST, offset: 0 };
  const blankets = await listBlankets(user, { ...latest, deleted: 'no' });
  const [faces, swatches, stash, shopping] = await Promise.all([
    listBlanketFaces(
      user,
      blankets.items.map(({ id }) => id),
    ),
    listSwatches(user, latest),
    listStash(user),
    Promise.all(blankets.items.map(({ id }) => shoppingOrNull(user, id))),
  ]);
  return {
    onHook: blankets.items.map((blanket, i) => ({
      blanket,
      face: faces[blanket.id],
      shopping: shopping[i] ?? null,
    })),
    blanketCount: blankets.total,
    swatches: swatches.items,
    swatchCount: swatches.total,
    stash: {
      lotCount: stash.total,
      totalM: stash.items.reduce((sum, { totalM }) => sum + totalM, 0),
    },
  };
}

async function shoppingOrNull(user: CurrentUser, id: string): Promise<BlanketShopping | null> {
  try {
    return await getBlanketShopping(user, id);
  } catch (error) {
    if (error instanceof AppError && error.code === 'gone') return null;
    throw error;
  }
}

import { LIST_LIMITS } from '../schemas/limits';
import type { Parsed, Schema } from '../schemas/schema';
import { get } from './api';

type ItemOf<List extends Schema> = Parsed<List> extends { items: (infer Item)[] } ? Item : never;

/** Every item of a list, page by page. */
export async function getAll<List extends Schema>(
  path: string,
  list: List,
  signal?: AbortSignal,
): Promise<ItemOf<List>[]> {
  const items: ItemOf<List>[] = [];
  for (;;) {
    const page = `${path}?limit=${LIST_LIMITS.most}&offset=${items.length}`;
    const answer = (await get(page, list, { signal })) as {
      items: ItemOf<List>[];
      total: number;
    };
    items.push(...answer.items);
    if (answer.items.length === 0 || items.length >= answer.total) return items;
  }
}

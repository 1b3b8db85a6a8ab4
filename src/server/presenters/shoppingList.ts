import type { ShoppingList } from '../../../db/models';
import type { KeptShoppingList } from '../../schemas/shoppingList';

export function presentShoppingList(row: ShoppingList): KeptShoppingList {
  const bought = new Set(row.bought);
  return {
    id: row.id,
    version: row.version,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
    blanketId: row.blanketId,
    title: row.title,
    yarnName: row.yarnName,
    confidence: row.confidence,
    currency: row.currency,
    lines: row.lines.map((line) => ({ ...line, bought: bought.has(line.colour) })),
    toBuySkeins: row.lines.reduce((sum, { toBuySkeins }) => sum + toBuySkeins, 0),
    costMinor:
      row.currency === null
        ? null
        : row.lines.reduce((sum, { costMinor }) => sum + (costMinor ?? 0), 0),
  };
}

import type { RoundElement } from './elements';
import { meanTurn, nearestTurn } from './turns';

/** What stands along a round, before it has its place. */
export interface Order {
  readonly elements: readonly RoundElement[];
  /** Where the feet of each are, in turns; null where it hangs on nothing. */
  readonly foots: readonly (number | null)[];
  readonly direction: 1 | -1;
}

/** An element that is held at a place, both along the direction of work. */
export interface Anchor {
  readonly element: number;
  readonly at: number;
}

/**
 * Holds the middle of every corner at a corner of the shape; by `shift` turns the corners then stand
 * beside what they are worked into. No anchors where there are not as many corners as sides.
 */
export function cornersOf(
  { elements, foots, direction }: Order,
  sides: number,
): { anchors: Anchor[]; shift: number } {
  const middles = new Map<number, number[]>();
  elements.forEach(({ corner }, i) => {
    if (corner !== null) middles.set(corner, [...(middles.get(corner) ?? []), i]);
  });
  if (sides === 0 || middles.size !== sides) return { anchors: [], shift: 0 };
  const corners = [...middles.values()]
    .map((indices) => indices[Math.floor(indices.length / 2)] ?? 0)
    .sort((a, b) => a - b);
  const footTurns = corners.map((element) => footNear(foots, element));
  const [first = null] = footTurns;
  const nearest = first === null ? 0 : Math.round(first * sides - 0.5);
  const turns = corners.map((_, i) => (nearest + direction * i + 0.5) / sides);
  const anchors = corners.map((element, i): Anchor => ({
    element,
    at: direction * (turns[i] ?? 0),
  }));
  const known = footTurns.flatMap((foot, i) =>
    foot === null ? [] : [nearestTurn((turns[i] ?? 0) - foot, 0)],
  );
  const total = known.reduce((sum, turn) => sum + turn, 0);
  return { anchors, shift: known.length === 0 ? 0 : total / known.length };
}

/** The foot of an element, or halfway between the feet beside it. */
function footNear(foots: readonly (number | null)[], element: number): number | null {
  const own = foots[element] ?? null;
  if (own !== null) return own;
  const count = foots.length;
  const beside = [-1, 1].map((step) => {
    for (let walked = 1; walked < count; walked += 1) {
      const foot = foots[(element + step * walked + count * walked) % count] ?? null;
      if (foot !== null) return foot;
    }
    return undefined;
  });
  return meanTurn(beside);
}

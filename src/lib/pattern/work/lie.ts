import type { Below, DraftPlace } from './state';

/** How a place of a round lies over the round below. */
export interface Lie {
  /** Stitch places before and after it, round the round. */
  readonly left: number;
  readonly right: number;
  /** Stitches of the round below from the middle of the one to the middle of the other; 0 in one place. */
  readonly reach: number;
  /** Whether both are worked into the same place. */
  readonly inPlace: boolean;
  /** The corner of the round below that it lies in or passes over, or null. */
  readonly corner: number | null;
  readonly width: number;
}

/** Lies of all places of a round: stitches are one wide, spaces as wide as what they reach over. */
export function liesOf(places: readonly DraftPlace[], below: Below): Lie[] {
  const lefts = nearestStitches(places, 1);
  const rights = nearestStitches(places, -1);
  const middles = middlesOf(below);
  return places.map((place, i): Lie => {
    const left = lefts[i] ?? i;
    const right = rights[i] ?? i;
    const from = places[left]?.into ?? -1;
    const to = places[right]?.into ?? -1;
    if (place.kind === 'stitch' || from < 0 || to < 0) {
      const corner = below.places[place.into]?.corner ?? null;
      const width = place.kind === 'stitch' ? 1 : place.chains;
      return { left, right, reach: 0, inPlace: below.kind === 'ring', corner, width };
    }
    const inPlace = from === to;
    const reach = inPlace ? 0 : middles.between(from, to);
    const corner = inPlace ? (below.places[from]?.corner ?? null) : middles.cornerBetween(from, to);
    const flat = inPlace
      ? Math.min(place.chains, 2)
      : Math.min(place.chains, Math.round(reach - 1));
    return { left, right, reach, inPlace, corner, width: Math.max(1, flat) };
  });
}

/** For each place the nearest stitch before it (step 1: walked forward) or after it, round the round. */
function nearestStitches(places: readonly DraftPlace[], step: 1 | -1): number[] {
  const nearest: number[] = [];
  let last = -1;
  const count = places.length;
  for (let walked = 0; walked < 2 * count; walked += 1) {
    const i = step === 1 ? walked % count : count - 1 - (walked % count);
    nearest[i] = last < 0 ? i : last;
    if (places[i]?.kind === 'stitch') last = i;
  }
  return nearest;
}

function middlesOf({ places, order }: Below) {
  const middle = new Map<number, number>();
  const rank = new Map<number, number>();
  const cornersAt: { rank: number; corner: number }[] = [];
  let total = 0;
  order.forEach((index, i) => {
    const place = places[index];
    const width = place?.width ?? 1;
    middle.set(index, total + width / 2);
    rank.set(index, i);
    total += width;
    if (place && place.corner !== null) cornersAt.push({ rank: i, corner: place.corner });
  });
  // The gap after a place lies where that place ends.
  const middleOf = (index: number): number =>
    Number.isInteger(index)
      ? (middle.get(index) ?? 0)
      : (middle.get(Math.floor(index)) ?? 0) + (places[Math.floor(index)]?.width ?? 1) / 2;
  const rankOf = (index: number): number =>
    (rank.get(Math.floor(index)) ?? 0) + (Number.isInteger(index) ? 0 : 0.5);
  return {
    between(from: number, to: number): number {
      const distance = middleOf(to) - middleOf(from);
      return distance < 0 ? distance + total : distance;
    },
    cornerBetween(from: number, to: number): number | null {
      const start = rankOf(from);
      const end = rankOf(to) + (rankOf(to) < start ? order.length : 0);
      const found = cornersAt.find(
        (each) =>
          (each.rank > start && each.rank < end) ||
          (each.rank + order.length > start && each.rank + order.length < end),
      );
      return found?.corner ?? null;
    },
  };
}

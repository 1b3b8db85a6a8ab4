import type { Into, Place, WorkedRound } from '../pattern/reading';
import type { RoundElement } from './elements';

/** A gap is half a place on from the place before it. */
const GAP = 0.5;

/** The place of the round below that a stitch stands in, by its index, or null for none. */
export const placeOf = (into: Into | undefined): number | null =>
  into?.kind === 'place' ? into.index + (into.gap ? GAP : 0) : null;

/**
 * Places of the round below that each element stands in. A decrease gathers as many stitches as it has
 * legs, as far as no other stitch stands in them; chains hang on nothing unless they stand for a stitch.
 */
export function feetOf(
  round: WorkedRound,
  elements: readonly RoundElement[],
  below: readonly Place[],
): number[][] {
  const taken = new Set(round.stitches.flatMap(({ into }) => placeOf(into) ?? []));
  return elements.map((element): number[] => {
    const { into } = round.stitches[element.members[0] ?? -1] ?? {};
    if (element.kind === 'loop' || into?.kind !== 'place' || !below[into.index]) return [];
    if (into.gap) return [into.index + GAP];
    return legPlaces(into.index, element.legs, round.turned ? -1 : 1, below, taken);
  });
}

function legPlaces(
  first: number,
  legs: number,
  step: 1 | -1,
  below: readonly Place[],
  taken: ReadonlySet<number>,
): number[] {
  const places = [first];
  if (below[first]?.kind === 'space') return places;
  for (let walked = 1; places.length < legs && walked < below.length; walked += 1) {
    const index = (first + step * walked + below.length) % below.length;
    if (taken.has(index)) break;
    if (below[index]?.kind === 'stitch') places.push(index);
  }
  return places;
}

import type { Place, WorkedRound } from '../pattern/reading';
import type { RoundElement } from './elements';

/**
 * Places of the round below that each element stands in. A decrease gathers as many stitches as it has
 * legs, as far as no other stitch stands in them; chains hang on nothing unless they stand for a stitch.
 */
export function feetOf(
  round: WorkedRound,
  elements: readonly RoundElement[],
  below: readonly Place[],
): number[][] {
  const taken = new Set(
    round.stitches.flatMap(({ into }) => (into.kind === 'place' ? [into.index] : [])),
  );
  return elements.map((element): number[] => {
    const { into } = round.stitches[element.members[0] ?? -1] ?? {};
    if (element.kind === 'loop' || into?.kind !== 'place' || !below[into.index]) return [];
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

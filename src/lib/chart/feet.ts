import type { Place, WorkedRound } from '../pattern/reading';
import type { RoundElement } from './elements';

/**
 * Places of the round below that each element stands in. A decrease gathers as many stitches as it has
 * legs, as far as no other stitch stands in them; a turning chain stands where the stitch after it does.
 */
export function feetOf(
  round: WorkedRound,
  elements: readonly RoundElement[],
  below: readonly Place[],
): number[][] {
  const taken = new Set(
    round.stitches.flatMap(({ into }) => (into.kind === 'place' ? [into.index] : [])),
  );
  const feet = elements.map((element): number[] => {
    const { into } = round.stitches[element.members[0] ?? -1] ?? {};
    if (element.kind === 'loop' || into?.kind !== 'place' || !below[into.index]) return [];
    return legPlaces(into.index, element.legs, round.turned ? -1 : 1, below, taken);
  });
  return feet.map((own, i) => {
    const element = elements[i];
    const isTurning = element?.kind === 'column' && element.beginning === 'turning';
    return isTurning ? (feet.slice(i + 1).find(({ length }) => length > 0) ?? []) : own;
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

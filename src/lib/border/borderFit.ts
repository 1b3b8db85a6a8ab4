import type { BorderRound } from '../plan/plan';
import { borderRounds, type BorderWork } from './borderRounds';
import { mapSides, sumSides, type Edging, type FourSides } from './edging';

/** A round of sc with 3 in each corner adds this many stitches to every side. */
const ADDED_BY_SC_ROUND = 2;

/** A way to make an edging come out even at all four corners. */
export type BorderFix =
  /** More or fewer stitches along each side of the round before; `inserted` where that must be a new round of sc. */
  | { readonly kind: 'adjust'; readonly inserted: boolean; readonly add: FourSides }
  /** So many rounds of sc before it. */
  | { readonly kind: 'rounds'; readonly count: number };

/** A round of border with whether its repeat comes out even. */
export interface BorderCheck extends BorderWork {
  /** Null of a plain round, which always does. */
  readonly even: boolean | null;
  /** Stitches that each side has over a whole number of repeats. */
  readonly left: FourSides;
  readonly fixes: readonly BorderFix[];
}

/**
 * Every round of a border on an edge of whole stitches. An edging comes out even when each side, from
 * one corner stitch up to the next, is a whole number of its repeats, so that all four corners get the
 * same part of it; what it needs once besides is on the first side.
 *
 * Example: shells of 6 over sides of 136, 170, 136 and 170: 4, 2, 4 and 2 are left over.
 */
export function borderChecks(rounds: readonly BorderRound[], edge: FourSides): BorderCheck[] {
  return borderRounds(rounds, mapSides(edge, Math.round)).map((work, i): BorderCheck => {
    const { edging } = rounds[i] as BorderRound;
    if (!edging) return { ...work, even: null, left: [0, 0, 0, 0], fixes: [] };
    const left = leftOver(edging, work.over);
    const even = left.every((each) => each === 0) && sumSides(work.over) >= edging.over.least;
    return { ...work, even, left, fixes: even ? [] : fixesOf(rounds, i, edging, work.over) };
  });
}

/** Stitches of a side beyond whole repeats; of the first side beyond what is needed once besides. */
function leftOver({ over: { least, multipleOf } }: Edging, over: FourSides): FourSides {
  return mapSides(over, (side, i) => {
    const besides = i === 0 ? least % multipleOf : 0;
    return (((Math.round(side) - besides) % multipleOf) + multipleOf) % multipleOf;
  });
}

function fixesOf(
  rounds: readonly BorderRound[],
  at: number,
  edging: Edging,
  over: FourSides,
): BorderFix[] {
  const before = rounds[at - 1];
  const inserted = !before || before.edging !== undefined;
  const base = inserted ? mapSides(over, (side) => side + ADDED_BY_SC_ROUND) : over;
  const adjust: BorderFix = { kind: 'adjust', inserted, add: additions(edging, base) };
  const count = scRoundsToFit(edging, over);
  return count === null ? [adjust] : [adjust, { kind: 'rounds', count }];
}

/** The nearest change of each side, rather more than fewer, that leaves it at least one repeat. */
function additions(edging: Edging, over: FourSides): FourSides {
  const { multipleOf, least } = edging.over;
  const nearest = mapSides(leftOver(edging, over), (left, i) => {
    const fewer = left <= (multipleOf - 1) / 2 && (over[i] ?? 0) - left >= multipleOf;
    return left === 0 || fewer ? 0 - left : multipleOf - left;
  });
  let lacking = least - sumSides(over) - sumSides(nearest);
  return mapSides(nearest, (add) => {
    const more = Math.max(0, Math.ceil(lacking / multipleOf)) * multipleOf;
    lacking -= more;
    return add + more;
  });
}

function scRoundsToFit(edging: Edging, over: FourSides): number | null {
  for (let count = 1; count <= edging.over.multipleOf; count += 1) {
    const grown = mapSides(over, (side) => side + ADDED_BY_SC_ROUND * count);
    if (leftOver(edging, grown).every((left) => left === 0) && sumSides(grown) >= edging.over.least)
      return count;
  }
  return null;
}

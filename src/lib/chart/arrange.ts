import type { Gauge } from '../gauge/gauge';
import type { Place, Reading, WorkedRound } from '../pattern/reading';
import { elementsOf, type RoundElement, type RoundElements } from './elements';
import { feetOf } from './feet';
import { spread, type Standing } from './spread';

/** A round with the place along it of everything that it is made of. */
export interface ArrangedRound extends RoundElements {
  readonly round: WorkedRound;
  /** 1 as the first round is worked, -1 back. */
  readonly direction: 1 | -1;
  /** Of each element: in turns round a motif, in mm along rows. */
  readonly alongs: readonly number[];
  /** Of each place that the next round can be worked into. */
  readonly placeAlongs: readonly number[];
  /** Places below that each element stands in. */
  readonly feet: readonly (readonly number[])[];
}

interface Below {
  readonly places: readonly Place[];
  readonly alongs: readonly number[];
  readonly hasCorners: boolean;
}

/** Pull of the feet in rows, whose ends nothing holds: ours. */
const ROW_PULL = 0.4;

/** Places everything along the rounds of a motif, in turns: corners at the corners, the rest between. */
export function arrangeRounds({ rounds, sides }: Reading, gauge: Gauge): ArrangedRound[] {
  let below: Below = { places: [], alongs: [], hasCorners: false };
  let direction: 1 | -1 = 1;
  let arranged: ArrangedRound[] = [];
  for (const round of rounds) {
    if (round.turned) direction = direction === 1 ? -1 : 1;
    const made = elementsOf(round, gauge, sides);
    const feet = feetOf(round, made.elements, below.places);
    const foots = feet.map((places) => meanTurn(places.map((place) => below.alongs[place])));
    const sharing = sharingOf(feet);
    const inCorner = feet.map(([place]) => (below.places[place ?? -1]?.corner ?? null) !== null);
    const order = { elements: made.elements, foots, inCorner, sharing, direction };
    const corners = cornersOf(order, sides, below);
    if (corners.shift !== 0) {
      arranged = arranged.map((each) => shifted(each, corners.shift));
      below = { ...below, alongs: below.alongs.map((along) => along + corners.shift) };
    }
    const alongs = aroundFrom(order, corners.anchors, corners.shift);
    const placeAlongs = placeAlongsOf(round, made.elements, alongs);
    arranged.push({ ...made, round, direction, alongs, placeAlongs, feet });
    below = { places: round.places, alongs: placeAlongs, hasCorners: corners.anchors.length > 0 };
  }
  return arranged;
}

/** Places everything along rows, in mm: each stitch over its foot, ends free. */
export function arrangeRows({ rounds, ring }: Reading, gauge: Gauge): ArrangedRound[] {
  const { stitchWidthMm } = gauge;
  let below: Below = {
    places: ring.places,
    alongs: ring.places.map((_, i) => (i + 0.5) * stitchWidthMm),
    hasCorners: false,
  };
  let direction: 1 | -1 = 1;
  return rounds.map((round) => {
    if (round.turned) direction = direction === 1 ? -1 : 1;
    const made = elementsOf(round, gauge, 0);
    const feet = feetOf(round, made.elements, below.places);
    const standing = made.elements.map(({ widthMm }, i): Standing => {
      const own = feet[i] ?? [];
      const mean = own.reduce((sum, place) => sum + (below.alongs[place] ?? 0), 0) / own.length;
      return { width: widthMm, foot: own.length > 0 ? direction * mean : null };
    });
    const alongs = spread(standing, null, null, ROW_PULL).map((along) => direction * along);
    const placeAlongs = placeAlongsOf(round, made.elements, alongs);
    below = { places: round.places, alongs: placeAlongs, hasCorners: false };
    return { ...made, round, direction, alongs, placeAlongs, feet };
  });
}

interface Order {
  elements: readonly RoundElement[];
  foots: readonly (number | null)[];
  /** What stands in a corner below is held by the corner above, not drawn in to its foot. */
  inCorner: readonly boolean[];
  /** How many elements stand in the same place as each. */
  sharing: readonly number[];
  direction: 1 | -1;
}

/** An element that is held at a place, both along the direction of work. */
interface Anchor {
  readonly element: number;
  readonly at: number;
}

/**
 * Holds the middle of every corner at a corner of the shape. Rounds worked before there were corners
 * turn by `shift`, so that the corners stand over what they are worked into.
 */
function cornersOf({ elements, foots, direction }: Order, sides: number, below: Below) {
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
  const shift =
    below.hasCorners || known.length === 0
      ? 0
      : known.reduce((sum, turn) => sum + turn, 0) / known.length;
  return { anchors, shift };
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

/** Places of all elements round the motif, from corner to corner, or evenly where nothing holds them. */
function aroundFrom(
  { elements, foots, inCorner, sharing, direction }: Order,
  anchors: readonly Anchor[],
  shift: number,
): number[] {
  const count = elements.length;
  if (count === 0) return [];
  const even = evenly(elements, foots, direction);
  const held = anchors.length > 0 ? anchors : [{ element: 0, at: even[0] ?? 0 }];
  const alongs: number[] = [];
  held.forEach(({ element, at }, i) => {
    const next = held[i + 1];
    const first = held[0] as Anchor;
    const end = next ?? { element: first.element + count, at: first.at + 1 };
    const between = Array.from({ length: end.element - element - 1 }, (_, j) => element + 1 + j);
    const room = (end.at - at) / Math.max(1, end.element - element);
    const places = spread(
      between.map((each, j): Standing => {
        const free = anchors.length > 0 && inCorner[each % count];
        const foot = free ? null : (foots[each % count] ?? null);
        const expected = at + room * (j + 1);
        return {
          width: elements[each % count]?.widthMm ?? 1,
          sharing: sharing[each % count] ?? 1,
          foot: foot === null ? null : nearestTurn(direction * (foot + shift), expected),
        };
      }),
      { at, width: elements[element]?.widthMm ?? 1 },
      { at: end.at, width: elements[end.element % count]?.widthMm ?? 1 },
    );
    alongs[element] = direction * at;
    between.forEach((each, j) => (alongs[each % count] = direction * (places[j] ?? 0)));
  });
  return alongs;
}

/** Along the direction of work: by width alone, turned so that heads stand over feet on the whole. */
function evenly(
  elements: readonly RoundElement[],
  foots: readonly (number | null)[],
  direction: 1 | -1,
): number[] {
  const total = elements.reduce((sum, { widthMm }) => sum + widthMm, 0);
  let along = 0;
  const places = elements.map(({ widthMm }, i) => {
    if (i > 0) along += (widthMm + (elements[i - 1]?.widthMm ?? 0)) / 2 / total;
    return along;
  });
  const lean = meanTurn(
    foots.map((foot, i) => (foot === null ? undefined : direction * foot - (places[i] ?? 0))),
  );
  return places.map((place) => place + (lean ?? 0));
}

const shifted = (arranged: ArrangedRound, turn: number): ArrangedRound => ({
  ...arranged,
  alongs: arranged.alongs.map((along) => along + turn),
  placeAlongs: arranged.placeAlongs.map((along) => along + turn),
});

function placeAlongsOf(
  { places }: WorkedRound,
  elements: readonly RoundElement[],
  alongs: readonly number[],
): number[] {
  const placeAlongs = places.map(() => 0);
  elements.forEach(({ place }, i) => {
    if (place !== null) placeAlongs[place] = alongs[i] ?? 0;
  });
  return placeAlongs;
}

function sharingOf(feet: readonly (readonly number[])[]): number[] {
  const users = new Map<number, number>();
  for (const [place] of feet) {
    if (place !== undefined) users.set(place, (users.get(place) ?? 0) + 1);
  }
  return feet.map(([place]) => users.get(place ?? -1) ?? 1);
}

/** The same turn, less than half a turn from `near`. */
const nearestTurn = (turn: number, near: number): number => turn - Math.round(turn - near);

/** Mean of directions, null of none. */
function meanTurn(turns: readonly (number | undefined)[]): number | null {
  let [x, y] = [0, 0];
  for (const turn of turns) {
    if (turn === undefined) continue;
    x += Math.cos(2 * Math.PI * turn);
    y += Math.sin(2 * Math.PI * turn);
  }
  return Math.hypot(x, y) < 1e-9 ? null : Math.atan2(y, x) / (2 * Math.PI);
}

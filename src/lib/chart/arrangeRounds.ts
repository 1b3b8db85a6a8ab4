import type { Gauge } from '../gauge/gauge';
import type { Place, Reading } from '../pattern/reading';
import { directionOf, placeAlongsOf, type ArrangedRound } from './arranged';
import { cornersOf, type Anchor, type Order } from './corners';
import { elementsOf } from './elements';
import { feetOf } from './feet';
import { FOOT_PULL, spread, type Standing } from './spread';
import { meanTurn, nearestTurn } from './turns';

/**
 * Places everything along the rounds of a motif, in turns: corners at the corners, the rest between.
 * Rounds worked before there were corners are turned, so that the corners stand over what they are
 * worked into. `apothemsMm` are those of the ring and of each round.
 */
export function arrangeRounds(
  { rounds, sides }: Reading,
  gauge: Gauge,
  apothemsMm: readonly number[],
): ArrangedRound[] {
  let places: readonly Place[] = [];
  let below: readonly number[] = [];
  let isPolygon = false;
  let direction: 1 | -1 = 1;
  let arranged: ArrangedRound[] = [];
  for (const [index, round] of rounds.entries()) {
    direction = directionOf(round, direction);
    const made = elementsOf(round, gauge, sides);
    const feet = feetOf(round, made.elements, places);
    const foots = feet.map((own) => meanTurn(own.map((place) => below[place])));
    const { anchors, shift } = cornersOf({ elements: made.elements, foots, direction }, sides);
    const growth = isPolygon ? (apothemsMm[index + 1] ?? 1) / (apothemsMm[index] ?? 1) : 1;
    const turn = isPolygon ? 0 : shift;
    if (turn !== 0) arranged = arranged.map((each) => turned(each, turn));
    const order = {
      elements: made.elements,
      direction,
      foots: foots.map((foot) =>
        foot === null ? null : straightAbove(foot + turn, sides, growth),
      ),
      // What stands in a corner below is held by the corner above, not drawn in to its foot.
      free: feet.map(
        ([place]) => anchors.length > 0 && (places[place ?? -1]?.corner ?? null) !== null,
      ),
      sharing: sharingOf(feet),
    };
    const roundMm = perimeterMm(apothemsMm[index + 1] ?? 1, isPolygon ? sides : 0);
    const isOpen = anchors.length === 0 && isUnfinished(order, round.joined, roundMm);
    const alongs = isOpen ? openFrom(order, roundMm) : aroundFrom(order, anchors, roundMm);
    const placeAlongs = placeAlongsOf(round.places, made.elements, alongs);
    arranged.push({ ...made, round, direction, isOpen, alongs, placeAlongs, feet });
    places = round.places;
    below = placeAlongs;
    isPolygon ||= anchors.length > 0;
  }
  return arranged;
}

interface FullOrder extends Order {
  readonly free: readonly boolean[];
  /** How many elements stand in the same place as each. */
  readonly sharing: readonly number[];
}

/** Places of all elements round the motif, from corner to corner, or evenly where nothing holds them. */
function aroundFrom(order: FullOrder, anchors: readonly Anchor[], roundMm: number): number[] {
  const { elements, foots, free, sharing, direction } = order;
  const count = elements.length;
  if (count === 0) return [];
  const held = anchors.length > 0 ? anchors : [{ element: 0, at: evenly(order)[0] ?? 0 }];
  const first = held[0] as Anchor;
  // Where there is more room than stitches, feet decide more than widths do.
  const widthMm = elements.reduce((sum, element) => sum + element.widthMm, 0);
  const pull = FOOT_PULL * Math.max(1, roundMm / widthMm) ** 2;
  const alongs: number[] = [];
  held.forEach(({ element, at }, i) => {
    const end = held[i + 1] ?? { element: first.element + count, at: first.at + 1 };
    const between = Array.from({ length: end.element - element - 1 }, (_, j) => element + 1 + j);
    const step = (end.at - at) / Math.max(1, end.element - element);
    const standing = between.map((each, j): Standing => {
      const foot = free[each % count] ? null : (foots[each % count] ?? null);
      return {
        width: elements[each % count]?.widthMm ?? 1,
        sharing: sharing[each % count] ?? 1,
        foot: foot === null ? null : nearestTurn(direction * foot, at + step * (j + 1)),
      };
    });
    const places = spread(
      standing,
      { at, width: elements[element]?.widthMm ?? 1 },
      { at: end.at, width: elements[end.element % count]?.widthMm ?? 1 },
      pull,
    );
    alongs[element] = direction * at;
    between.forEach((each, j) => (alongs[each % count] = direction * (places[j] ?? 0)));
  });
  return alongs;
}

/** A gap this wide between feet next to one another is a part not worked yet, in turns: ours. */
const UNWORKED = 0.4;
/** A first round this much shorter than its outline is not worked all the way round: ours. */
const SHORT_ROUND = 0.6;

const perimeterMm = (apothemMm: number, sides: number): number =>
  2 * apothemMm * (sides === 0 ? Math.PI : sides * Math.tan(Math.PI / sides));

/** Whether a round ends somewhere on its way, as it does while it is typed. */
function isUnfinished({ elements, foots }: Order, joined: boolean, roundMm: number): boolean {
  const turns = foots.flatMap((foot) => (foot === null ? [] : [foot - Math.floor(foot)]));
  if (turns.length === 0) {
    const widthMm = elements.reduce((sum, element) => sum + element.widthMm, 0);
    return !joined && widthMm < SHORT_ROUND * roundMm;
  }
  turns.sort((a, b) => a - b);
  const gaps = turns.map((turn, i) => (turns[i + 1] ?? (turns[0] ?? 0) + 1) - turn);
  return Math.max(...gaps) > UNWORKED;
}

/** An unfinished round: each stitch over its foot, as far as it goes. */
function openFrom({ elements, foots, sharing, direction }: FullOrder, roundMm: number): number[] {
  let expected = 0;
  const standing = elements.map(({ widthMm }, i): Standing => {
    const foot = foots[i] ?? null;
    if (foot !== null) expected = nearestTurn(direction * foot, expected);
    return {
      width: widthMm / roundMm,
      sharing: sharing[i] ?? 1,
      foot: foot === null ? null : expected,
    };
  });
  const [first] = standing;
  if (first && standing.every(({ foot }) => foot === null)) standing[0] = { ...first, foot: 0 };
  return spread(standing, null, null).map((along) => direction * along);
}

/** Along the direction of work: by width alone, turned so that heads stand over feet on the whole. */
function evenly({ elements, foots, direction }: Order): number[] {
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

const turned = (arranged: ArrangedRound, turn: number): ArrangedRound => ({
  ...arranged,
  alongs: arranged.alongs.map((along) => along + turn),
  placeAlongs: arranged.placeAlongs.map((along) => along + turn),
});

/** On a straight side the place over a foot is nearer the middle of the side, counted in turns. */
function straightAbove(foot: number, sides: number, growth: number): number {
  if (sides === 0) return foot;
  const middle = Math.round(foot * sides) / sides;
  return middle + (foot - middle) / growth;
}

function sharingOf(feet: readonly (readonly number[])[]): number[] {
  const users = new Map<number, number>();
  for (const [place] of feet) {
    if (place !== undefined) users.set(place, (users.get(place) ?? 0) + 1);
  }
  return feet.map(([place]) => users.get(place ?? -1) ?? 1);
}

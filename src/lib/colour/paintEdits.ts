import { SLOT_FACTS } from '../layout/face';
import { neighboursOf } from '../layout/planeMap';
import type { BlanketMotif, LaidBlanket } from '../plan/blanketFaces';
import type { Colourway, Plan } from '../plan/plan';
import type { PaintedRun, Placement, PlacementRule } from './placement';

/**
 * The plan with these motifs locked in the colourway that each of them names, whatever the rule:
 * painted ones, or all as they lie.
 */
export function withPainted(plan: Plan, motifs: readonly BlanketMotif[]): Plan {
  const places = placesOf(plan);
  for (const { face, colourway } of motifs) {
    places.set(key(SLOT_FACTS[face.slot].second, face.row, face.column), colourway);
  }
  return withPlaces(plan, places);
}

/** The plan with a colourway like `colourway` but for one round, and its number; null without such a round. */
export function withRecoloured(
  plan: Plan,
  colourway: number,
  round: number,
  colour: string,
): { plan: Plan; colourway: number } | null {
  const old = plan.colourways[colourway];
  if (!old || round >= old.roundColours.length) return null;
  const wanted: Colourway = {
    ...old,
    roundColours: old.roundColours.map((each, i) => (i === round ? colour : each)),
  };
  const known = plan.colourways.findIndex((each) => isSame(each, wanted));
  return known < 0
    ? { plan: withColourwayByHand(plan, wanted), colourway: plan.colourways.length }
    : { plan, colourway: known };
}

/** A colourway that comes of painting takes no turns: the rest of the blanket stays as it is. */
const withColourwayByHand = (plan: Plan, colourway: Colourway): Plan => ({
  ...plan,
  colourways: [...plan.colourways, colourway],
  placement: {
    ...plan.placement,
    byHand: [...plan.placement.byHand, plan.colourways.length],
  },
});

/** The plan with a colourway placed by the rule, or only where it is painted. */
export const withTurns = (plan: Plan, colourway: number, takesTurns: boolean): Plan => {
  const others = plan.placement.byHand.filter((each) => each !== colourway);
  const byHand = takesTurns ? others : [...others, colourway].sort((left, right) => left - right);
  return { ...plan, placement: { ...plan.placement, byHand } };
};

const isSame = (left: Colourway, right: Colourway): boolean =>
  left.motifIndex === right.motifIndex && left.roundColours.join() === right.roundColours.join();

/** The plan with another rule for what is not painted. */
export const withRule = (plan: Plan, rule: PlacementRule): Plan => ({
  ...plan,
  placement: { ...plan.placement, rule },
});

/** The plan with nothing painted or locked: the rule has its way everywhere. */
export const withoutPaint = (plan: Plan): Plan => ({
  ...plan,
  placement: { ...plan.placement, painted: [] },
});

/** The motif at `start` and all of its colourway that hang together with it by their sides. */
export function sameAround({ motifs, map }: LaidBlanket, start: number): BlanketMotif[] {
  const neighbours = neighboursOf(map());
  const colourway = motifs[start]?.colourway;
  const found = new Set([start]);
  for (const motif of found) {
    for (const near of neighbours[motif] ?? []) {
      if (motifs[near]?.colourway === colourway) found.add(near);
    }
  }
  return [...found].flatMap((motif) => motifs[motif] ?? []);
}

const ROWS = 2_000;
const COLUMNS = 2_000;
const key = (second: boolean, row: number, column: number): number =>
  ((second ? ROWS : 0) + row) * COLUMNS + column;

function placesOf({ placement, colourways, secondMotif }: Plan): Map<number, number> {
  const places = new Map<number, number>();
  for (const [row, column, length, colourway] of placement.painted) {
    const second = secondMotif !== null && colourways[colourway]?.motifIndex === secondMotif;
    for (let i = 0; i < length; i += 1) places.set(key(second, row, column + i), colourway);
  }
  return places;
}

function withPlaces(plan: Plan, places: ReadonlyMap<number, number>): Plan {
  const painted: PaintedRun[] = [];
  let end = -1;
  for (const place of [...places.keys()].sort((left, right) => left - right)) {
    const colourway = places.get(place) as number;
    const last = painted.at(-1);
    if (last && place === end && last[3] === colourway) {
      painted[painted.length - 1] = [last[0], last[1], last[2] + 1, colourway];
    } else {
      painted.push([Math.floor(place / COLUMNS) % ROWS, place % COLUMNS, 1, colourway]);
    }
    end = place + 1;
  }
  const placement: Placement = { ...plan.placement, painted };
  return { ...plan, placement };
}

import { SLOT_FACTS, type Face } from '../layout/face';
import { neighboursOf, type PlaneMap } from '../layout/planeMap';
import { evenQuotas, scatter } from './scatter';
import { seeded } from './seeded';
import type { Placement, PlacementRule, Stripes } from './placement';

/** Colourways of the plan that the main and the second motifs may have. */
export interface ColourwayGroups {
  readonly main: readonly number[];
  readonly second: readonly number[];
}

export interface PlacedColourways {
  /** For each face, the number of its colourway in the plan. */
  readonly colourways: readonly number[];
  /** Pairs of neighbours of one colourway that a placement at random could not avoid; 0 for every other. */
  readonly alike: number;
}

/** How many positions a gradient is mixed over where one colourway becomes the next, in colourways (ours). */
const MIXED_OVER = 0.7;

/**
 * A colourway for every face. Painted places keep theirs; the others follow the rule, main and
 * second motifs each with their own colourways. The same placement always gives the same.
 *
 * Example: two colourways along the diagonals of two rows of three: 0 1 0, 1 0 1.
 */
export function placeColourways(
  { rule, painted, byHand }: Placement,
  groups: ColourwayGroups,
  faces: readonly Face[],
  map: () => PlaneMap,
): PlacedColourways {
  const colourways = faces.map(() => -1);
  let alike = 0;
  for (const second of [false, true]) {
    const group = second ? groups.second : groups.main;
    const members = faces.flatMap(({ slot }, i) => (SLOT_FACTS[slot].second === second ? [i] : []));
    if (group.length === 0 || members.length === 0) continue;
    const turns = takingTurns(group, byHand);
    const locked = lockedPlaces(painted, group);
    const settled = members.map((i) => locked.get(addressOf(faces[i] as Face)) ?? null);
    if (rule.by === 'random') {
      // A colourway that only lies where it is painted is like no neighbour's.
      const open = members.flatMap((_, k) =>
        settled[k] == null || turns.includes(settled[k]) ? [k] : [],
      );
      const placed = atRandom(
        rule,
        turns,
        open.map((k) => members[k] as number),
        open.map((k) => settled[k] ?? null),
        map(),
      );
      members.forEach((i, k) => (colourways[i] = settled[k] ?? -1));
      open.forEach((k, j) => (colourways[members[k] as number] = placed.colourways[j] as number));
      alike += placed.alike;
    } else {
      const follow = ruleOf(
        rule,
        turns,
        members.map((i) => faces[i] as Face),
      );
      members.forEach((i, k) => (colourways[i] = settled[k] ?? follow(faces[i] as Face)));
    }
  }
  return { colourways, alike };
}

/** Those of a group that the rule may place; all of them where none would be left. */
export function takingTurns(
  group: readonly number[],
  byHand: readonly number[],
): readonly number[] {
  const turns = group.filter((colourway) => !byHand.includes(colourway));
  return turns.length > 0 ? turns : group;
}

const ROW_STEP = 10_000;
const addressOf = ({ row, column }: Pick<Face, 'row' | 'column'>): number =>
  row * ROW_STEP + column;

function lockedPlaces(
  painted: Placement['painted'],
  group: readonly number[],
): ReadonlyMap<number, number> {
  const places = new Map<number, number>();
  for (const [row, column, length, colourway] of painted) {
    if (!group.includes(colourway)) continue;
    for (let i = 0; i < length; i += 1) {
      places.set(addressOf({ row, column: column + i }), colourway);
    }
  }
  return places;
}

type Follow = (face: Face) => number;

function ruleOf(
  rule: Exclude<PlacementRule, { by: 'random' }>,
  group: readonly number[],
  faces: readonly Face[],
): Follow {
  const pick = (turn: number): number => group[turn % group.length] as number;
  if (rule.by === 'repeat') {
    const diagonals: Follow = ({ row, column }) => pick(row + column);
    return (face) => {
      const tileRow = rule.tile[face.row % rule.tile.length];
      const colourway = tileRow?.[face.column % tileRow.length];
      return colourway ?? diagonals(face);
    };
  }
  if (rule.by === 'gradient') return gradient(rule, group, faces);
  const turn = TURNS[rule.by];
  return ({ row, column }) => pick(turn(row, column, rule.width));
}

const TURNS: Readonly<Record<Stripes, (row: number, column: number, width: number) => number>> = {
  diagonals: (row, column, width) => Math.floor((row + column) / width),
  rows: (row, _, width) => Math.floor(row / width),
  columns: (_, column, width) => Math.floor(column / width),
  checks: (row, column, width) => Math.floor(row / width) + Math.floor(column / width),
};

function gradient(
  { towards, order, seed }: PlacementRule & { by: 'gradient' },
  group: readonly number[],
  faces: readonly Face[],
): Follow {
  const ordered = order.filter((colourway) => group.includes(colourway));
  const steps = ordered.length > 0 ? ordered : group;
  const random = seeded(seed);
  const across = share(faces, 0);
  const down = share(faces, 1);
  const far = (face: Face): number =>
    ({
      down: down(face),
      across: across(face),
      'to the corner': (down(face) + across(face)) / 2,
      outwards: Math.hypot(2 * down(face) - 1, 2 * across(face) - 1) / Math.SQRT2,
    })[towards];
  return (face) => {
    const mixed = far(face) * steps.length + MIXED_OVER * (random() - 0.5);
    return steps[Math.min(steps.length - 1, Math.max(0, Math.floor(mixed)))] as number;
  };
}

/** How far along an axis of the blanket a face lies, 0 to 1. */
function share(faces: readonly Face[], axis: 0 | 1): (face: Face) => number {
  let [least, most] = [Infinity, -Infinity];
  for (const { centre } of faces) {
    least = Math.min(least, centre[axis]);
    most = Math.max(most, centre[axis]);
  }
  return ({ centre }) => (most > least ? (centre[axis] - least) / (most - least) : 0.5);
}

function atRandom(
  { seed, counts }: PlacementRule & { by: 'random' },
  group: readonly number[],
  members: readonly number[],
  settled: readonly (number | null)[],
  map: PlaneMap,
): PlacedColourways {
  const random = seeded(seed);
  const memberOf = new Map(members.map((face, member) => [face, member]));
  const all = neighboursOf(map);
  const neighbours = members.map((face) =>
    (all[face] ?? []).flatMap((near) => memberOf.get(near) ?? []),
  );
  const asked = counts && group.map((colourway) => counts[colourway] ?? 0);
  const { kinds, alike } = scatter({
    neighbours,
    settled: settled.map((colourway) => (colourway === null ? null : group.indexOf(colourway))),
    quotas: asked ?? evenQuotas(members.length, group.length, random),
    random,
  });
  return { colourways: kinds.map((kind) => group[kind] as number), alike };
}

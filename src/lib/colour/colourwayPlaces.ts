import { layoutFaces, mapOf } from '../layout/layoutFaces';
import { SLOTS, type Face, type Slot } from '../layout/face';
import { gridCounts } from '../layout/gridCounts';
import type { Arrangement } from '../layout/layouts';
import type { PlaneMap } from '../layout/planeMap';
import { STRIPES, type Placement } from './placement';
import { stripeCounts } from './stripeCounts';
import {
  placeColourways,
  takingTurns,
  type ColourwayGroups,
  type PlacedColourways,
} from './placeColourways';

/** A blanket motif by motif: where each lies, and its colourway. */
export interface ColouredLayout extends PlacedColourways {
  readonly faces: readonly Face[];
  /** Made when first asked for: a large one takes a while. */
  readonly map: () => PlaneMap;
}

/** How many whole, half and quarter motifs each colourway has. */
export type SlotCounts = Readonly<Record<Slot, number>>;

const NO_MOTIFS = Object.fromEntries(SLOTS.map((slot) => [slot, 0])) as SlotCounts;

/** What was laid out last: an estimate, its picture and its list of steps ask for the same. */
let last: { key: string; placement: Placement; result: ColouredLayout } | null = null;

/** Every motif of a blanket with its colourway. Cost grows with the motifs. */
export function colouredLayout(
  arrangement: Arrangement,
  rows: number,
  columns: number,
  placement: Placement,
  groups: ColourwayGroups,
): ColouredLayout {
  const key = JSON.stringify([arrangement, rows, columns, groups]);
  if (last?.key === key && last.placement === placement) return last.result;
  const faces = layoutFaces(arrangement, rows, columns);
  let made: PlaneMap | null = null;
  const map = (): PlaneMap => (made ??= mapOf(faces));
  const result = { faces, map, ...placeColourways(placement, groups, faces, map) };
  last = { key, placement, result };
  return result;
}

/**
 * Motifs of each of the plan's `count` colourways, by slot. Where colourways only take turns in a
 * full grid, without laying it out.
 */
export function slotCounts(
  arrangement: Arrangement,
  rows: number,
  columns: number,
  placement: Placement,
  groups: ColourwayGroups,
  count: number,
): SlotCounts[] {
  const { rule, painted } = placement;
  const places = gridCounts(arrangement, rows, columns);
  const stripes = STRIPES.find((by) => by === rule.by);
  if (
    stripes &&
    'width' in rule &&
    painted.length === 0 &&
    places.motifs === rows * columns &&
    !hasParts(places)
  ) {
    const turns = takingTurns(groups.main, placement.byHand);
    const motifs = stripeCounts(rule, rows, columns, turns.length);
    return Array.from({ length: count }, (_, i) => ({
      ...NO_MOTIFS,
      motifs: motifs[turns.indexOf(i)] ?? 0,
    }));
  }
  const counts = Array.from({ length: count }, () => ({ ...NO_MOTIFS }) as Record<Slot, number>);
  const { faces, colourways } = colouredLayout(arrangement, rows, columns, placement, groups);
  faces.forEach(({ slot }, i) => {
    const ofColourway = counts[colourways[i] as number];
    if (ofColourway) ofColourway[slot] += 1;
  });
  return counts;
}

const hasParts = (places: SlotCounts): boolean =>
  SLOTS.some((slot) => slot !== 'motifs' && places[slot] > 0);

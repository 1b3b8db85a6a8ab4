import { SLOT_FACTS, type Face } from '../layout/face';
import { requireGrid } from '../layout/gridCounts';
import { layoutFaces, mapOf } from '../layout/layoutFaces';
import type { Arrangement } from '../layout/layouts';
import type { Plan } from '../plan/plan';
import { joiningSteps, type CornerReason } from './joiningSteps';
import { makingOrder, type MakingOrder } from './makingOrder';

/** A motif by its row and its place in it, from 1; second motifs are numbered apart. */
export interface MotifAddress {
  readonly row: number;
  readonly column: number;
  readonly second?: true;
}

/** One motif to make: what it links to, by address. */
export interface OrderedStep extends MotifAddress {
  readonly sides: readonly { readonly side: string; readonly to: MotifAddress }[];
  readonly corners: readonly {
    readonly corner: string;
    readonly to: MotifAddress | null;
    readonly reason: CornerReason;
  }[];
}

/**
 * The joining order of a layout on its own, motif by motif. Throws DomainError unless rows and
 * columns are whole numbers from 1 to 400.
 *
 * Example: of 1 × 2 squares the second links its left side, and its two left corners, to the first.
 */
export function joiningOrder(
  arrangement: Arrangement,
  rows: number,
  columns: number,
  corners: Plan['corners'],
  order: MakingOrder,
): OrderedStep[] {
  requireGrid(rows, columns);
  const faces = layoutFaces(arrangement, rows, columns);
  const map = mapOf(faces);
  const made = makingOrder(arrangement.layout, faces, map, order);
  const addresses = faces.map(addressOf);
  const at = (face: number): MotifAddress => addresses[face] as MotifAddress;
  return joiningSteps(arrangement.layout, faces, map, made, corners).map((step) => ({
    ...at(step.face),
    sides: step.sides.map(({ side, to }) => ({ side, to: at(to) })),
    corners: step.corners.map((link) => ({ ...link, to: link.to === null ? null : at(link.to) })),
  }));
}

/** A face's own address: `{ row: 1, column: 1 }` for the first. */
export const addressOf = ({ slot, row, column }: Face): MotifAddress => ({
  row: row + 1,
  column: column + 1,
  ...(SLOT_FACTS[slot].second ? { second: true } : {}),
});

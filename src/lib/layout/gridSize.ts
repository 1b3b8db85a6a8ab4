import { apothemsAcross } from '../motifs/geometry';
import type { MotifSides } from '../motifs/motif';
import type { PlanSize } from '../plan/plan';
import { along, MOST_ROWS } from './gridCounts';
import { cornerInsets, placed } from './lattice';
import { layoutFaces } from './layoutFaces';
import type { Arrangement } from './layouts';

/** What sets the size of a blanket, in mm. */
export interface GridMeasures {
  /** Of the main motif. */
  readonly sides: MotifSides;
  /** Main motif, as `MotifGeometry.acrossMm`. */
  readonly acrossMm: number;
  /** Added by each seam. */
  readonly seamMm: number;
  /** Rounds that the join adds outside the outermost motifs, on one side. */
  readonly edgeMm: number;
  /** Width of the border on one side. */
  readonly borderMm: number;
}

export interface GridSize {
  readonly widthMm: number;
  readonly heightMm: number;
}

/** Half of a motif with half a seam round it, in mm: the unit of a layout's lattice. */
export const cellApothemMm = ({ sides, acrossMm, seamMm }: GridMeasures): number =>
  acrossMm / apothemsAcross(sides) + seamMm / 2;

/**
 * Finished size: the outermost motifs, with rounds that a join adds outside them, and the border.
 *
 * Example: 8 × 10 squares of 142 mm, 5 mm seams, no edge, 15 mm border: 1201 × 1495 mm.
 */
export function gridSize(
  arrangement: Arrangement,
  rows: number,
  columns: number,
  measures: GridMeasures,
): GridSize {
  const extent = along(rows, (r) => along(columns, (c) => smallExtent(arrangement, r, c)));
  const apothemMm = cellApothemMm(measures);
  const outsideMm = 2 * (measures.edgeMm + measures.borderMm);
  const halfSeamMm = measures.seamMm / 2;
  return {
    widthMm: extent.width * apothemMm - extent.widthInset * halfSeamMm + outsideMm,
    heightMm: extent.height * apothemMm - extent.heightInset * halfSeamMm + outsideMm,
  };
}

/** Where the lattice's own corner lies in the finished blanket, in mm from its top left corner. */
export function gridOrigin(
  arrangement: Arrangement,
  rows: number,
  columns: number,
  { seamMm, edgeMm, borderMm }: GridMeasures,
): readonly [xMm: number, yMm: number] {
  const { leftInset, topInset } = smallExtent(arrangement, Math.min(rows, 2), Math.min(columns, 2));
  const outsideMm = edgeMm + borderMm;
  return [outsideMm - (leftInset * seamMm) / 2, outsideMm - (topInset * seamMm) / 2];
}

/**
 * Size of the motifs' cells in their apothems, how often half a seam goes off it in all, and on
 * the left and at the top.
 */
type Extent = Readonly<
  Record<'width' | 'height' | 'widthInset' | 'heightInset' | 'leftInset' | 'topInset', number>
>;

const known = new Map<string, Extent>();

function smallExtent(arrangement: Arrangement, rows: number, columns: number): Extent {
  const key = `${arrangement.layout} ${arrangement.edge} ${rows} ${columns}`;
  const extent = known.get(key) ?? extentOf(arrangement, rows, columns);
  known.set(key, extent);
  return extent;
}

function extentOf(arrangement: Arrangement, rows: number, columns: number): Extent {
  const points = layoutFaces(arrangement, rows, columns).flatMap((face) => {
    const outline = face.points.map((point) => placed(arrangement.layout, point));
    const insets = cornerInsets(outline);
    return outline.map((at, i) => ({ at, inset: insets[i] as [number, number] }));
  });
  const [width, widthInset, leftInset] = span(points, 0);
  const [height, heightInset, topInset] = span(points, 1);
  return { width, widthInset, leftInset, height, heightInset, topInset };
}

function span(
  points: readonly { at: readonly number[]; inset: readonly number[] }[],
  axis: 0 | 1,
): [size: number, inset: number, firstInset: number] {
  // Of corners equally far out, the one that reaches furthest once drawn in counts.
  const along = points
    .map(({ at, inset }) => [at[axis] ?? 0, inset[axis] ?? 0] as const)
    .sort((left, right) => left[0] - right[0] || left[1] - right[1]);
  const first = along[0] ?? [0, 0];
  const furthest = along.at(-1)?.[0] ?? 0;
  const last = along.filter(([at]) => furthest - at < 1e-9);
  return [furthest - first[0], first[1] - Math.max(...last.map(([, inset]) => inset)), first[1]];
}

/** Rows and columns of a plan: as given, or those whose finished size meets its target. */
export function gridFor(
  arrangement: Arrangement,
  size: PlanSize,
  measures: GridMeasures,
): { rows: number; columns: number } {
  if (size.by === 'grid') return { rows: size.rows, columns: size.columns };
  const heightMm = (n: number): number => gridSize(arrangement, n, 1, measures).heightMm;
  const rows = countFor(size.heightMm, size.rule, heightMm);
  const widthMm = (n: number): number => gridSize(arrangement, rows, n, measures).widthMm;
  return { rows, columns: countFor(size.widthMm, size.rule, widthMm) };
}

function countFor(
  targetMm: number,
  rule: 'nearest' | 'at-least',
  sizeMm: (count: number) => number,
): number {
  let count = 1;
  while (count < MOST_ROWS && sizeMm(count) < targetMm) count += 1;
  if (rule === 'at-least' || count === 1) return count;
  return targetMm - sizeMm(count - 1) <= sizeMm(count) - targetMm ? count - 1 : count;
}

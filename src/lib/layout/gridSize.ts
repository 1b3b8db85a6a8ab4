import type { PlanSize } from '../plan/plan';
import { MOST_ROWS } from './gridCounts';
import type { Layout } from './layouts';

/** What sets the size of a blanket, in mm. */
export interface GridMeasures {
  /** Motif, flat to flat. */
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

/**
 * Finished size: columns × motif + (columns - 1) × seam + 2 × (edge + border), and so on down.
 * Rows of hexagons nest by a quarter of their height and stand half a motif right of one another.
 *
 * Example: 8 × 10 squares of 142 mm, 5 mm seams, no edge, 15 mm border: 1201 × 1495 mm.
 */
export function gridSize(
  layout: Layout,
  rows: number,
  columns: number,
  measures: GridMeasures,
): GridSize {
  const { acrossMm, seamMm } = measures;
  const outsideMm = 2 * (measures.edgeMm + measures.borderMm);
  const straight = (count: number): number => count * acrossMm + (count - 1) * seamMm + outsideMm;
  if (layout === 'square') return { widthMm: straight(columns), heightMm: straight(rows) };
  const sideMm = acrossMm / Math.sqrt(3);
  const rowMm = 1.5 * sideMm + (Math.sqrt(3) / 2) * seamMm;
  return {
    widthMm: straight(columns) + (rows > 1 ? (acrossMm + seamMm) / 2 : 0),
    heightMm: 2 * sideMm + (rows - 1) * rowMm + outsideMm,
  };
}

/** Rows and columns of a plan: as given, or those whose finished size meets its target. */
export function gridFor(
  layout: Layout,
  size: PlanSize,
  measures: GridMeasures,
): { rows: number; columns: number } {
  if (size.by === 'grid') return { rows: size.rows, columns: size.columns };
  const rows = countFor(size.heightMm, size.rule, (n) => gridSize(layout, n, 1, measures).heightMm);
  const columns = countFor(
    size.widthMm,
    size.rule,
    (n) => gridSize(layout, rows, n, measures).widthMm,
  );
  return { rows, columns };
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

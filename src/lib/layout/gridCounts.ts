import { DomainError } from '../errors';
import { layoutMap, type Layout } from './layouts';
import type { PlaneMap } from './planeMap';

/** Largest number of rows or of columns. */
export const MOST_ROWS = 400;

export interface GridCounts {
  readonly motifs: number;
  readonly joinedSides: number;
  readonly outerSides: number;
  /** Points inside the blanket where corners meet. */
  readonly insideJunctions: number;
  /** Points on the outer edge where two corners meet. */
  readonly edgeJunctions: number;
  /** Corners of one motif on the outer edge. */
  readonly outerCorners: number;
}

/** Counts read off a map, side by side and corner by corner. */
export function countsOf(map: PlaneMap): GridCounts {
  const joinedSides = map.sides.filter(({ motifs }) => motifs.length === 2).length;
  const outerCorners = map.corners.filter((corner) => corner.outer);
  const single = outerCorners.filter(({ motifs }) => motifs.length === 1).length;
  return {
    motifs: map.outlines.length,
    joinedSides,
    outerSides: map.sides.length - joinedSides,
    insideJunctions: map.corners.length - outerCorners.length,
    edgeJunctions: outerCorners.length - single,
    outerCorners: single,
  };
}

/**
 * Counts of a layout of any size at the cost of a small one: every count grows by a fixed step with
 * each pair of rows and each pair of columns, so maps of 2 to 5 rows and columns give all of them.
 * Throws DomainError unless rows and columns are whole numbers from 1 to 400.
 *
 * Example: `gridCounts('square', 14, 16).joinedSides` is 418.
 */
export function gridCounts(layout: Layout, rows: number, columns: number): GridCounts {
  for (const count of [rows, columns]) {
    if (!(Number.isInteger(count) && count >= 1 && count <= MOST_ROWS)) {
      throw new DomainError(
        'grid-out-of-range',
        `gridCounts requires whole rows and columns from 1 to ${MOST_ROWS}, got ${rows} × ${columns}`,
      );
    }
  }
  return along(rows, (r) => along(columns, (c) => smallCounts(layout, r, c)));
}

function along(size: number, at: (small: number) => GridCounts): GridCounts {
  if (size <= 5) return at(size);
  const near = 2 + (size % 2);
  const steps = (size - near) / 2;
  const first = at(near);
  const second = at(near + 2);
  const line = (key: keyof GridCounts): number => first[key] + steps * (second[key] - first[key]);
  return {
    motifs: line('motifs'),
    joinedSides: line('joinedSides'),
    outerSides: line('outerSides'),
    insideJunctions: line('insideJunctions'),
    edgeJunctions: line('edgeJunctions'),
    outerCorners: line('outerCorners'),
  };
}

const known = new Map<string, GridCounts>();

function smallCounts(layout: Layout, rows: number, columns: number): GridCounts {
  const key = `${layout} ${rows} ${columns}`;
  const counts = known.get(key) ?? countsOf(layoutMap(layout, rows, columns));
  known.set(key, counts);
  return counts;
}

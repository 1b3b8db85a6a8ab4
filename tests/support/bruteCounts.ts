import type { GridCounts } from '../../src/lib/layout/gridCounts';
import type { Layout } from '../../src/lib/layout/layouts';

/**
 * Counts of a layout from the coordinates of its corners alone, without names, parity or steps:
 * two motifs share a side when the middles of the sides fall on one point.
 */
export function bruteCounts(layout: Layout, rows: number, columns: number): Partial<GridCounts> {
  const outline = layout === 'square' ? squareAt : hexagonAt;
  const sidesAt = new Map<string, number>();
  const motifsAt = new Map<string, number>();
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const corners = outline(row, column);
      corners.forEach((corner, i) => {
        const next = corners[(i + 1) % corners.length] as Point;
        add(motifsAt, nameOf(corner));
        add(sidesAt, nameOf([(corner[0] + next[0]) / 2, (corner[1] + next[1]) / 2]));
      });
    }
  }
  const joinedSides = [...sidesAt.values()].filter((motifs) => motifs === 2).length;
  const outerSides = sidesAt.size - joinedSides;
  // Motifs that meet at a point inside the blanket leave no angle open.
  const all = layout === 'square' ? 4 : 3;
  const meeting = (motifs: number): number =>
    [...motifsAt.values()].filter((count) => count === motifs).length;
  return {
    motifs: rows * columns,
    joinedSides,
    outerSides,
    insideJunctions: meeting(all),
    edgeJunctions: [...motifsAt.values()].filter((count) => count > 1 && count < all).length,
    outerCorners: meeting(1),
  };
}

type Point = [x: number, y: number];

const squareAt = (row: number, column: number): Point[] =>
  [45, 135, 225, 315].map((angle) => around([column * Math.SQRT2, row * Math.SQRT2], angle));

/** Pointed top, corners at distance 1 from the centre; rows 1.5 apart, odd ones half a width right. */
function hexagonAt(row: number, column: number): Point[] {
  const centre: Point = [(column + (row % 2) / 2) * Math.sqrt(3), row * 1.5];
  return [30, 90, 150, 210, 270, 330].map((angle) => around(centre, angle));
}

const around = ([x, y]: Point, degrees: number): Point => [
  x + Math.cos((degrees * Math.PI) / 180),
  y + Math.sin((degrees * Math.PI) / 180),
];

const nameOf = ([x, y]: Point): string => `${Math.round(x * 1e6)} ${Math.round(y * 1e6)}`;

const add = (counts: Map<string, number>, key: string): void => {
  counts.set(key, (counts.get(key) ?? 0) + 1);
};

import type { MotifSides } from '../motifs/motif';
import { planeMap, type PlaneMap } from './planeMap';

/** Square grid (squares, and circles that touch their four neighbours), or hexagons in offset rows. */
export type Layout = 'square' | 'offset-hexagons';

/** The layout that motifs of this many sides are planned in, or null where there is none yet. */
export function layoutFor(sides: MotifSides): Layout | null {
  if (sides === 6) return 'offset-hexagons';
  return sides === 4 || sides === 0 ? 'square' : null;
}

/** Plane map of `rows` × `columns` motifs, row by row; odd rows of hexagons stand half a motif right. */
export function layoutMap(layout: Layout, rows: number, columns: number): PlaneMap {
  const outline = layout === 'square' ? squareOutline : hexagonOutline;
  return planeMap(
    Array.from({ length: rows * columns }, (_, i) =>
      outline(Math.floor(i / columns), i % columns).map(([x, y]) => `${x},${y}`),
    ),
  );
}

type Point = readonly [x: number, y: number];

const squareOutline = (row: number, column: number): Point[] => [
  [column, row],
  [column + 1, row],
  [column + 1, row + 1],
  [column, row + 1],
];

/** Pointed top; x in half widths, y in quarters of the height, so that every corner is a whole number. */
function hexagonOutline(row: number, column: number): Point[] {
  const x = 2 * column + (row % 2);
  const y = 3 * row;
  return [
    [x + 1, y],
    [x + 2, y + 1],
    [x + 2, y + 3],
    [x + 1, y + 4],
    [x, y + 3],
    [x, y + 1],
  ];
}

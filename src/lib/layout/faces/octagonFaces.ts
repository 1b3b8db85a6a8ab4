import { face, grid, upTo, type Face } from '../face';
import { squareOnPoint } from './squareOnPoint';

/**
 * Octagons in rows and columns with a square on point in each gap, three units to an octagon (cut
 * corner, side, cut corner). Straight: half squares along the edge and quarters at its corners.
 */
export function octagonFaces(rows: number, columns: number, straight: boolean): Face[] {
  return [
    ...grid(rows, columns, octagon),
    ...(straight
      ? grid(rows + 1, columns + 1, (row, column) => gap(row, column, rows, columns))
      : upTo(rows - 1).flatMap((row) =>
          upTo(columns - 1).map((column) => gap(row + 1, column + 1, rows, columns)),
        )),
  ];
}

function octagon(row: number, column: number): Face {
  const [x, y] = [3 * column, 3 * row];
  return face({
    row,
    column,
    points: [
      [x + 1, y],
      [x + 2, y],
      [x + 3, y + 1],
      [x + 3, y + 2],
      [x + 2, y + 3],
      [x + 1, y + 3],
      [x, y + 2],
      [x, y + 1],
    ],
    centre: [x + 1.5, y + 1.5],
  });
}

/** The square where four octagons meet, or as much of it as lies within the blanket. */
const gap = (row: number, column: number, rows: number, columns: number): Face =>
  squareOnPoint({
    row,
    column,
    centre: [3 * column, 3 * row],
    slots: ['fillers', 'halfFillers', 'quarterFillers'],
    isInside: ([x, y]) => x >= 0 && y >= 0 && x <= 3 * columns && y <= 3 * rows,
  });

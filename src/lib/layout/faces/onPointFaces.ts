import { grid, upTo, type Face } from '../face';
import { squareOnPoint } from './squareOnPoint';

/**
 * Squares standing on a corner, odd rows half a motif right, in half diagonals. Straight: half
 * squares fill the edges and quarters the corners; rows are then numbered from the infill on top.
 */
export function onPointFaces(rows: number, columns: number, straight: boolean): Face[] {
  const slots = ['motifs', 'halves', 'quarters'] as const;
  if (!straight) {
    return grid(rows, columns, (row, column) =>
      squareOnPoint({
        row,
        column,
        centre: [2 * column + 1 + (row % 2), row + 1],
        slots,
        isInside: () => true,
      }),
    );
  }
  return upTo(rows + 2).flatMap((row): Face[] => {
    // The infill on top is an odd row: its middles lie between those of the first row.
    const odd = row % 2 === 0;
    return upTo(odd ? columns + 1 : columns).map((column) =>
      squareOnPoint({
        row,
        column,
        centre: [2 * column + (odd ? 0 : 1), row],
        slots,
        isInside: ([x, y]) => x >= 0 && y >= 0 && x <= 2 * columns && y <= rows + 1,
      }),
    );
  });
}

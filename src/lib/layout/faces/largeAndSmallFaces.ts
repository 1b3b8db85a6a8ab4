import { face, grid, upTo, type Face, type LatticePoint } from '../face';

/**
 * Blocks of one large square and blocks of four small ones by turns, two units to a block. The
 * sides of a large square are halved where small ones meet it.
 */
export function largeAndSmallFaces(rows: number, columns: number): Face[] {
  return grid(rows, columns, (row, column) =>
    (row + column) % 2 === 0 ? [large(row, column, rows, columns)] : small(row, column),
  ).flat();
}

function large(row: number, column: number, rows: number, columns: number): Face {
  const [x, y] = [2 * column, 2 * row];
  const midpoint = (there: boolean, point: LatticePoint): LatticePoint[] => (there ? [point] : []);
  return face({
    row,
    // Large squares of a row are numbered without the blocks between them.
    column: Math.floor(column / 2),
    points: [
      [x, y],
      ...midpoint(row > 0, [x + 1, y]),
      [x + 2, y],
      ...midpoint(column < columns - 1, [x + 2, y + 1]),
      [x + 2, y + 2],
      ...midpoint(row < rows - 1, [x + 1, y + 2]),
      [x, y + 2],
      ...midpoint(column > 0, [x, y + 1]),
    ],
    centre: [x + 1, y + 1],
  });
}

const small = (row: number, column: number): Face[] =>
  upTo(2).flatMap((down) =>
    upTo(2).map((right) => {
      const [x, y] = [2 * column + right, 2 * row + down];
      return face({
        slot: 'fillers',
        row: y,
        column: x,
        points: [
          [x, y],
          [x + 1, y],
          [x + 1, y + 1],
          [x, y + 1],
        ],
        centre: [x + 0.5, y + 0.5],
      });
    }),
  );

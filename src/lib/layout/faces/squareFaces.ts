import { face, grid, type Face } from '../face';

/** Squares in rows and columns; circles lie alike. */
export const squareFaces = (rows: number, columns: number): Face[] =>
  grid(rows, columns, (row, column) =>
    face({
      row,
      column,
      points: [
        [column, row],
        [column + 1, row],
        [column + 1, row + 1],
        [column, row + 1],
      ],
      centre: [column + 0.5, row + 0.5],
    }),
  );

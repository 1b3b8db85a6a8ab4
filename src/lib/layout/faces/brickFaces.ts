import { face, upTo, type Face, type LatticePoint } from '../face';

/**
 * Squares in rows that stand half a motif off one another, two units of x to a motif. A side that
 * faces another row is halved by the corners that meet it there. Straight: every second row begins
 * and ends with half a motif.
 */
export function brickFaces(rows: number, columns: number, straight: boolean): Face[] {
  return upTo(rows).flatMap((row): Face[] => {
    const above = row > 0;
    const below = row < rows - 1;
    const whole = (column: number, x: number): Face =>
      face({
        row,
        column,
        points: [
          [x, row],
          ...(above ? ([[x + 1, row]] as LatticePoint[]) : []),
          [x + 2, row],
          [x + 2, row + 1],
          ...(below ? ([[x + 1, row + 1]] as LatticePoint[]) : []),
          [x, row + 1],
        ],
        centre: [x + 1, row + 0.5],
      });
    if (row % 2 === 0 || !straight) {
      return upTo(columns).map((column) => whole(column, 2 * column + (row % 2)));
    }
    const half = (column: number, x: number, centreX: number): Face =>
      face({
        slot: 'halves',
        row,
        column,
        points: [
          [x, row],
          [x + 1, row],
          [x + 1, row + 1],
          [x, row + 1],
        ],
        centre: [centreX, row + 0.5],
      });
    return [
      half(0, 0, 0),
      ...upTo(columns - 1).map((column) => whole(column + 1, 2 * column + 1)),
      half(columns, 2 * columns - 1, 2 * columns),
    ];
  });
}

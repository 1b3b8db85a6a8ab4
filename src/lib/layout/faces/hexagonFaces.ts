import { face, upTo, type Face } from '../face';

/**
 * Hexagons with a point at the top, odd rows half a motif right; x in half widths, y in quarters of
 * the height. Straight: every second row begins and ends with half a hexagon, cut from point to point.
 */
export function hexagonFaces(rows: number, columns: number, straight: boolean): Face[] {
  return upTo(rows).flatMap((row): Face[] => {
    const y = 3 * row;
    const whole = (column: number, x: number): Face =>
      face({
        row,
        column,
        points: [
          [x + 1, y],
          [x + 2, y + 1],
          [x + 2, y + 3],
          [x + 1, y + 4],
          [x, y + 3],
          [x, y + 1],
        ],
        centre: [x + 1, y + 2],
        turnDeg: 30,
      });
    if (row % 2 === 0 || !straight) {
      return upTo(columns).map((column) => whole(column, 2 * column + (row % 2)));
    }
    const right = 2 * columns;
    const half = { slot: 'halves', row, turnDeg: 30 } as const;
    return [
      face({
        ...half,
        column: 0,
        points: [
          [0, y],
          [1, y + 1],
          [1, y + 3],
          [0, y + 4],
        ],
        centre: [0, y + 2],
      }),
      ...upTo(columns - 1).map((column) => whole(column + 1, 2 * column + 1)),
      face({
        ...half,
        column: columns,
        points: [
          [right, y],
          [right, y + 4],
          [right - 1, y + 3],
          [right - 1, y + 1],
        ],
        centre: [right, y + 2],
      }),
    ];
  });
}

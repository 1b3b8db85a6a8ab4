import { face, upTo, type Face } from '../face';

/**
 * Equilateral triangles in strips, point up and point down by turns; x in half sides, y in heights.
 * Straight: every strip begins and ends with half a triangle, cut from its point down.
 */
export function triangleFaces(rows: number, columns: number, straight: boolean): Face[] {
  const first = straight ? 1 : 0;
  return upTo(rows).flatMap((row): Face[] => {
    const isUp = (place: number): boolean => (row + place) % 2 === 0;
    const about = (place: number) => ({
      row,
      column: place + first,
      centre: [place + 1, row + (isUp(place) ? 2 / 3 : 1 / 3)] as const,
      turnDeg: isUp(place) ? 180 : 0,
    });
    const wholes = upTo(columns).map((place) =>
      face({
        ...about(place),
        points: isUp(place)
          ? [
              [place + 1, row],
              [place + 2, row + 1],
              [place, row + 1],
            ]
          : [
              [place, row],
              [place + 2, row],
              [place + 1, row + 1],
            ],
      }),
    );
    if (!straight) return wholes;
    const right = columns + 1;
    return [
      face({
        ...about(-1),
        turnDeg: row % 2 === 0 ? 0 : 180,
        centre: [0, row + (row % 2 === 0 ? 1 / 3 : 2 / 3)],
        slot: 'halves',
        points:
          row % 2 === 0
            ? [
                [0, row],
                [1, row],
                [0, row + 1],
              ]
            : [
                [0, row],
                [1, row + 1],
                [0, row + 1],
              ],
      }),
      ...wholes,
      face({
        ...about(columns),
        slot: 'halves',
        points: isUp(columns)
          ? [
              [right, row],
              [right, row + 1],
              [right - 1, row + 1],
            ]
          : [
              [right - 1, row],
              [right, row],
              [right, row + 1],
            ],
      }),
    ];
  });
}

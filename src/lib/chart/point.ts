/** A place of the drawing, in mm; x to the right, y down. */
export type Point = readonly [xMm: number, yMm: number];

export const add = (a: Point, b: Point, times = 1): Point => [
  a[0] + times * b[0],
  a[1] + times * b[1],
];
export const minus = (a: Point, b: Point): Point => [a[0] - b[0], a[1] - b[1]];
export const between = (a: Point, b: Point, share: number): Point => add(a, minus(b, a), share);
export const distance = (a: Point, b: Point): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

/** The direction from one point to another, of length 1; up where they are the same. */
export function towards(from: Point, to: Point): Point {
  const length = distance(from, to);
  return length < 1e-9 ? [0, -1] : [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
}

/** A quarter turn clockwise as drawn. */
export const across = ([x, y]: Point): Point => [-y, x];

export const middleOf = (points: readonly Point[]): Point =>
  points.reduce<Point>((sum, point) => add(sum, point, 1 / points.length), [0, 0]);

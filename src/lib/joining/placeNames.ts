import type { Face } from '../layout/face';
import { placed } from '../layout/lattice';
import type { Layout } from '../layout/layouts';

/** What the sides and corners of a motif are called as it lies: "top", "bottom left". */
export interface PlaceNames {
  /** One for each stretch of its outline; half a side is named as such. */
  readonly sides: readonly string[];
  /** One for each point of its outline. */
  readonly corners: readonly string[];
}

const WINDS = [
  'right',
  'bottom right',
  'bottom',
  'bottom left',
  'left',
  'top left',
  'top',
  'top right',
] as const;

type Point = readonly [number, number];

const wind = ([x, y]: Point): string =>
  WINDS[(Math.round(Math.atan2(y, x) / (Math.PI / 4)) + 8) % 8] as string;

const minus = (left: Point, right: Point): Point => [left[0] - right[0], left[1] - right[1]];

/** Names of a face's sides and corners: those of a square are "top", "right", and "top left", "bottom right". */
export function placeNames(layout: Layout, { points }: Face): PlaceNames {
  const outline = points.map((point) => placed(layout, point));
  const next = (i: number): Point => outline[(i + 1) % outline.length] as Point;
  const middle: Point = [0, 1].map(
    (axis) => outline.reduce((sum, point) => sum + (point[axis] as number), 0) / outline.length,
  ) as unknown as Point;
  const steps = outline.map((point, i) => minus(next(i), point));
  // Clockwise with y downwards: what lies outside is to the left of the way round.
  const words = steps.map(([x, y]) => wind([y, -x]));
  const sides = words.map((word, i) => {
    const twin = words.findIndex((other, j) => j !== i && other === word);
    return twin < 0 ? word : `${word}, ${halfWord(centreOf(i), centreOf(twin))}`;
  });
  function centreOf(i: number): Point {
    const [from, to] = [outline[i] as Point, next(i)];
    return [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  }
  const towards = outline.map((point) => wind(minus(point, middle)));
  const corners = outline.map((_, i) => {
    const before = words.at(i - 1) as string;
    const after = words[i] as string;
    if (before === after) return `middle of ${after}`;
    const isAlone = towards.filter((word) => word === towards[i]).length === 1;
    return isAlone ? (towards[i] as string) : `between ${before} and ${after}`;
  });
  return { sides, corners };
}

function halfWord(here: Point, there: Point): string {
  const [x, y] = minus(here, there);
  if (Math.abs(x) > Math.abs(y)) return x < 0 ? 'left half' : 'right half';
  return y < 0 ? 'upper half' : 'lower half';
}

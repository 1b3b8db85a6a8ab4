import type { MotifSides } from '../motifs/motif';
import type { LatticePoint } from './face';
import type { Layout } from './layouts';

/** Half of what an octagon's side leaves of its width, over its width. */
const OCTAGON_CUT = (2 - Math.SQRT2) / 2;

type Along = (place: number) => number;
const times =
  (step: number): Along =>
  (place) =>
    place * step;

/** Where lattice places lie, in apothems of the main motif's cell: the motif with half a seam round it. */
const SCALES: Readonly<Record<Layout, { x: Along; y: Along }>> = {
  square: { x: times(2), y: times(2) },
  brick: { x: times(1), y: times(2) },
  'on-point': { x: times(Math.SQRT2), y: times(Math.SQRT2) },
  'large-and-small': { x: times(1), y: times(1) },
  'offset-hexagons': { x: times(1), y: times(1 / Math.sqrt(3)) },
  triangles: { x: times(Math.sqrt(3)), y: times(3) },
  octagons: { x: octagonPlace, y: octagonPlace },
};

function octagonPlace(place: number): number {
  const cell = Math.floor(place / 3);
  const within = place - 3 * cell;
  const share =
    within <= 1
      ? within * OCTAGON_CUT
      : within <= 2
        ? OCTAGON_CUT + (within - 1) * (1 - 2 * OCTAGON_CUT)
        : 1 - (3 - within) * OCTAGON_CUT;
  return 2 * (cell + share);
}

/** A lattice point in apothems of the main motif's cell. */
export const placed = (layout: Layout, [x, y]: LatticePoint): [number, number] => [
  SCALES[layout].x(x),
  SCALES[layout].y(y),
];

/** A side of the main motif's cell in its apothems; a circle's cell is a square. */
export const sideInApothems = (sides: MotifSides): number =>
  2 * Math.tan(Math.PI / (sides === 0 ? 4 : sides));

/** `outline` of a face, clockwise, drawn in by `by` on every side: for `by` 1, how far each corner moves. */
export function cornerInsets(outline: readonly (readonly [number, number])[]): [number, number][] {
  return outline.map((corner, i) => {
    const before = outline.at(i - 1) as readonly [number, number];
    const after = outline[(i + 1) % outline.length] as readonly [number, number];
    const [ax, ay] = direction(before, corner);
    const [bx, by] = direction(corner, after);
    // Inward normals of the two sides, and the point at distance 1 from both.
    const cosine = ax * bx + ay * by;
    return [-(ay + by) / (1 + cosine), (ax + bx) / (1 + cosine)];
  });
}

function direction(
  from: readonly [number, number],
  to: readonly [number, number],
): [number, number] {
  const [x, y] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(x, y);
  return [x / length, y / length];
}

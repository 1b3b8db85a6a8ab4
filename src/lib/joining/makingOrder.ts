import type { Face } from '../layout/face';
import { placed } from '../layout/lattice';
import type { Layout } from '../layout/layouts';
import { neighboursOf, type PlaneMap } from '../layout/planeMap';

/**
 * In which order motifs are made and joined. continuous: rows there and back, so that the yarn
 * need not be cut at their ends.
 */
export const MAKING_ORDERS = ['row-by-row', 'in-columns', 'outwards', 'continuous'] as const;
export type MakingOrder = (typeof MAKING_ORDERS)[number];

/** The faces of a layout by number, in the order they are made. */
export function makingOrder(
  layout: Layout,
  faces: readonly Face[],
  map: PlaneMap,
  order: MakingOrder,
): number[] {
  const all = faces.map((_, i) => i);
  const places = faces.map((face) => middleOf(layout, face));
  const x = (i: number): number => places[i]?.[0] ?? 0;
  const y = (i: number): number => places[i]?.[1] ?? 0;
  if (order === 'outwards') return outwards(map, x, y);
  if (order === 'in-columns') return sorted(all, x, y);
  const rowOf = rowsOf(layout, y);
  const back = (i: number): boolean => order === 'continuous' && rowNumber(i) % 2 === 1;
  const rows = [...new Set(all.map(rowOf))].sort((a, b) => a - b);
  const numbers = new Map(rows.map((row, number) => [row, number]));
  const rowNumber = (i: number): number => numbers.get(rowOf(i)) ?? 0;
  return sorted(all, rowOf, (i) => (back(i) ? -x(i) : x(i)), y);
}

/** Motifs of one row: of one height; strips of triangles, and blocks of large and small, as a whole. */
function rowsOf(layout: Layout, y: (i: number) => number): (i: number) => number {
  if (layout === 'triangles') return (i) => Math.floor(y(i) / 3);
  if (layout === 'large-and-small') return (i) => Math.floor(y(i) / 2);
  return y;
}

function sorted(faces: readonly number[], ...by: ((i: number) => number)[]): number[] {
  return faces.toSorted((left, right) => {
    for (const key of by) {
      const difference = key(left) - key(right);
      if (difference !== 0) return difference;
    }
    return 0;
  });
}

/** From the motif nearest the middle, ring by ring: all that touch, then all that touch those. */
function outwards(map: PlaneMap, x: (i: number) => number, y: (i: number) => number): number[] {
  const all = map.outlines.map((_, i) => i);
  const mean = (of: (i: number) => number): number =>
    all.reduce((sum, i) => sum + of(i), 0) / all.length;
  const [middleX, middleY] = [mean(x), mean(y)];
  const far = (i: number): number => Math.hypot(x(i) - middleX, y(i) - middleY);
  const [first] = sorted(all, (i) => tidy(far(i)), y, x);
  const neighbours = neighboursOf(map);
  const ring = new Map<number, number>(first === undefined ? [] : [[first, 0]]);
  for (const [face, number] of ring) {
    for (const near of neighbours[face] ?? []) if (!ring.has(near)) ring.set(near, number + 1);
  }
  const turn = (i: number): number =>
    tidy((Math.atan2(x(i) - middleX, middleY - y(i)) + 2 * Math.PI) % (2 * Math.PI));
  // A motif that only touches others at a point comes last.
  return sorted(
    all,
    (i) => ring.get(i) ?? Infinity,
    turn,
    (i) => tidy(far(i)),
  );
}

function middleOf(layout: Layout, { points }: Face): [number, number] {
  const outline = points.map((point) => placed(layout, point));
  return [0, 1].map((axis) =>
    tidy(outline.reduce((sum, point) => sum + (point[axis] as number), 0) / outline.length),
  ) as [number, number];
}

const tidy = (value: number): number => Math.round(value * 1e6) / 1e6;

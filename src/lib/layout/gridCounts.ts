import { DomainError } from '../errors';
import { SLOTS, type Face, type Slot } from './face';
import { placed, sideInApothems } from './lattice';
import { layoutFaces, mapOf } from './layoutFaces';
import { layoutFacts, type Arrangement } from './layouts';
import type { MapCorner, PlaneMap } from './planeMap';

/** Largest number of rows or of columns. */
export const MOST_ROWS = 400;

type MapCount =
  | 'joinedSides'
  | 'outerSides'
  | 'insideJunctions'
  | 'edgeJunctions'
  | 'outerCorners'
  | 'gatheredLinks'
  | 'crossedLinks'
  | 'seamLines';

/**
 * What there is of everything. Sides are counted in sides of the main motif, so that half a side
 * is half; `motifs` to `quarterFillers` as in `Slot`.
 * insideJunctions: points inside the blanket where corners meet; edgeJunctions: points on its outer
 * edge where two or more do; outerCorners: corners of one motif on the outer edge.
 * gatheredLinks, crossedLinks: times that a corner links to another in the whole blanket.
 * seamLines: lines that seams can be worked in without cutting the yarn.
 */
export type GridCounts = Readonly<Record<Slot | MapCount, number>>;

/** Counts read off a map, side by side and corner by corner. */
export function countsOf(
  { layout }: Pick<Arrangement, 'layout'>,
  faces: readonly Face[],
  map: PlaneMap,
): GridCounts {
  const wholeSide = sideInApothems(layoutFacts(layout).sides[0] ?? 4);
  const where = new Map(
    faces.flatMap(({ points }) => points.map((point) => [`${point[0]},${point[1]}`, point])),
  );
  const share = (ends: readonly [string, string]): number => {
    const [from, to] = ends.map((name) => placed(layout, where.get(name) ?? [0, 0]));
    const length = Math.hypot((from?.[0] ?? 0) - (to?.[0] ?? 0), (from?.[1] ?? 0) - (to?.[1] ?? 0));
    return tidy(length / wholeSide);
  };
  const sum = <T>(items: readonly T[], of: (item: T) => number): number =>
    tidy(items.reduce((total, item) => total + of(item), 0));
  const joined = map.sides.filter(({ motifs }) => motifs.length === 2);
  const outer = map.sides.filter(({ motifs }) => motifs.length === 1);
  const inside = map.corners.filter((corner) => !corner.outer);
  const edge = map.corners.filter((corner) => corner.outer && corner.motifs.length > 1);
  const edgeLinks = sum(edge, ({ motifs }) => motifs.length - 1);
  return {
    ...slotCounts(faces),
    joinedSides: sum(joined, ({ ends }) => share(ends)),
    outerSides: sum(outer, ({ ends }) => share(ends)),
    insideJunctions: inside.length,
    edgeJunctions: edge.length,
    outerCorners: map.corners.length - inside.length - edge.length,
    gatheredLinks: edgeLinks + sum(inside, ({ motifs }) => motifs.length - 1),
    crossedLinks: edgeLinks + sum(inside, crossedLinks),
    seamLines: joined.length - sum(inside, ({ motifs }) => Math.floor(motifs.length / 2)),
  };
}

/** Corners cross in pairs; an odd number of them cannot, and is gathered. */
export const canCross = (corners: number): boolean => corners % 2 === 0;
const crossedLinks = ({ motifs: { length } }: MapCorner): number =>
  canCross(length) ? length / 2 : length - 1;

/** Lengths along different ways that are the same differ in their last digits. */
const tidy = (value: number): number => Number(value.toPrecision(12));

function slotCounts(faces: readonly Face[]): Record<Slot, number> {
  const counts = Object.fromEntries(SLOTS.map((slot) => [slot, 0])) as Record<Slot, number>;
  for (const { slot } of faces) counts[slot] += 1;
  return counts;
}

/**
 * Counts of a layout of any size at the cost of a small one: every count grows by a fixed step with
 * each pair of rows and each pair of columns, so maps of 2 to 5 rows and columns give all of them.
 * Throws DomainError unless rows and columns are whole numbers from 1 to 400.
 *
 * Example: `gridCounts({ layout: 'square', edge: 'toothed' }, 14, 16).joinedSides` is 418.
 */
export function gridCounts(arrangement: Arrangement, rows: number, columns: number): GridCounts {
  requireGrid(rows, columns);
  return along(rows, (r) => along(columns, (c) => smallCounts(arrangement, r, c)));
}

/** Throws DomainError unless there are as many rows and columns as a blanket may have. */
export function requireGrid(rows: number, columns: number): void {
  for (const count of [rows, columns]) {
    if (!(Number.isInteger(count) && count >= 1 && count <= MOST_ROWS)) {
      throw new DomainError(
        'grid-out-of-range',
        `A layout requires whole rows and columns from 1 to ${MOST_ROWS}, got ${rows} × ${columns}`,
      );
    }
  }
}

/** What holds for sizes up to 5, carried on to any size by its steps of two. */
export function along<T extends Readonly<Record<string, number>>>(
  size: number,
  at: (small: number) => T,
): T {
  if (size <= 5) return at(size);
  const near = 2 + (size % 2);
  const steps = (size - near) / 2;
  const first = at(near);
  const second = at(near + 2);
  return Object.fromEntries(
    Object.entries(first).map(([key, value]) => [
      key,
      tidy(value + steps * ((second[key] ?? 0) - value)),
    ]),
  ) as T;
}

const known = new Map<string, GridCounts>();

function smallCounts(arrangement: Arrangement, rows: number, columns: number): GridCounts {
  const key = `${arrangement.layout} ${arrangement.edge} ${rows} ${columns}`;
  const before = known.get(key);
  if (before) return before;
  const faces = layoutFaces(arrangement, rows, columns);
  const counts = countsOf(arrangement, faces, mapOf(faces));
  known.set(key, counts);
  return counts;
}

import type { Face } from '../layout/face';
import { canCross } from '../layout/gridCounts';
import { placed } from '../layout/lattice';
import type { Layout } from '../layout/layouts';
import type { MapCorner, PlaneMap } from '../layout/planeMap';
import type { Plan } from '../plan/plan';
import { placeNames, type PlaceNames } from './placeNames';

/** Why a corner is linked, or not yet. */
export type CornerReason =
  /** On the outer edge: it links at once. */
  | 'edge'
  /** Inside, gathered: it links into the junction. */
  | 'gathered'
  /** Inside, crossed: it links across the diagonal. */
  | 'crossed'
  /** Inside, crossed: it waits for the motif across. */
  | 'open';

export interface SideLink {
  readonly side: string;
  /** Number of the face it links to. */
  readonly to: number;
}

export interface CornerLink {
  readonly corner: string;
  /** Number of the face it links to, or null while it is left open. */
  readonly to: number | null;
  readonly reason: CornerReason;
}

/** One motif made and joined. */
export interface JoiningStep {
  readonly face: number;
  readonly sides: readonly SideLink[];
  readonly corners: readonly CornerLink[];
}

/**
 * What every motif links to, in the order they are made: each joined side once, by the motif that
 * comes second; on the outer edge each corner that arrives links at once; inside, gathered corners
 * link into the first that stands there, crossed ones in pairs across it.
 *
 * Example: 2 × 2 squares crossed, row by row: the third links its top right corner to the second,
 * the fourth its top left corner to the first.
 */
export function joiningSteps(
  layout: Layout,
  faces: readonly Face[],
  map: PlaneMap,
  order: readonly number[],
  corners: Plan['corners'],
): JoiningStep[] {
  const names = namesOf(layout, faces);
  const made = new Set<number>();
  const sidesOf = byFace(map.sides, faces.length);
  const cornersByName = new Map(map.corners.map((corner) => [corner.name, corner]));
  const arrived = new Map<string, number[]>();
  return order.map((face) => {
    const outline = map.outlines[face] ?? [];
    const called = names[face] as PlaceNames;
    const neighbourAt = new Map(
      (sidesOf[face] ?? []).flatMap(({ ends, motifs }) => {
        const to = motifs.find((motif) => motif !== face);
        return to === undefined ? [] : [[[...ends].sort().join(' '), to] as const];
      }),
    );
    const sides = outline.flatMap((from, i): SideLink[] => {
      const end = outline[(i + 1) % outline.length] as string;
      const to = neighbourAt.get([from, end].sort().join(' '));
      return to !== undefined && made.has(to) ? [{ side: called.sides[i] as string, to }] : [];
    });
    const links = outline.flatMap((name, i): CornerLink[] => {
      const junction = cornersByName.get(name) as MapCorner;
      const before = arrived.get(name) ?? [];
      const link = linkAt(junction, before);
      arrived.set(name, [...before, face]);
      return link ? [{ corner: called.corners[i] as string, ...link }] : [];
    });
    made.add(face);
    return { face, sides, corners: links };

    function linkAt(junction: MapCorner, before: readonly number[]) {
      const beside = before.findLast((other) => [...neighbourAt.values()].includes(other));
      if (junction.outer) {
        const to = beside ?? before.at(-1);
        return to === undefined ? null : ({ to, reason: 'edge' } as const);
      }
      if (corners === 'gathered' || !canCross(junction.motifs.length)) {
        const [to] = before;
        return to === undefined ? null : ({ to, reason: 'gathered' } as const);
      }
      const across = acrossFrom(layout, faces, junction, face);
      return before.includes(across)
        ? ({ to: across, reason: 'crossed' } as const)
        : ({ to: null, reason: 'open' } as const);
    }
  });
}

/** The motif on the other side of a junction: half way round it. */
function acrossFrom(
  layout: Layout,
  faces: readonly Face[],
  { name, motifs }: MapCorner,
  face: number,
): number {
  const [x, y] = placed(layout, name.split(',').map(Number) as [number, number]);
  const angle = (i: number): number => {
    const [faceX, faceY] = placed(layout, (faces[i] as Face).centre);
    return Math.atan2(faceY - y, faceX - x);
  };
  const round = motifs.toSorted((left, right) => angle(left) - angle(right));
  return round[(round.indexOf(face) + round.length / 2) % round.length] as number;
}

function byFace<T extends { readonly motifs: readonly number[] }>(
  items: readonly T[],
  faces: number,
): T[][] {
  const lists: T[][] = Array.from({ length: faces }, () => []);
  for (const item of items) for (const motif of item.motifs) lists[motif]?.push(item);
  return lists;
}

/** Faces of one shape have the same names: worked out once for each. */
function namesOf(layout: Layout, faces: readonly Face[]): PlaceNames[] {
  const known = new Map<string, PlaceNames>();
  return faces.map((face) => {
    const [x, y] = face.points[0] ?? [0, 0];
    const shape = face.points.map((point) => `${point[0] - x},${point[1] - y}`).join(' ');
    const names = known.get(shape) ?? placeNames(layout, face);
    known.set(shape, names);
    return names;
  });
}

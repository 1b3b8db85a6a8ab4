import type { Corner, Place } from '../reading';
import type { Lie } from './lie';
import type { Below, DraftPlace } from './state';

export interface Corners {
  readonly corner: Corner;
  /** Indices of the corner places in the order of making. */
  readonly places: readonly number[];
  /** The number of each corner, by the corner of the round below that it stands on. */
  readonly numbers: readonly number[];
}

/** What was found: the corners, or how many there seem to be where they are not as many as the sides. */
export interface CornerSearch {
  readonly corners: Corners | null;
  readonly seeming: { readonly count: number; readonly what: string } | null;
}

/**
 * The corners of a round of a motif with sides: chain spaces over the corners below; or of the kind of
 * which there is one to a side, made inside a group; or the middle one of three stitches in one place.
 */
export function cornersOf(
  places: readonly DraftPlace[],
  lies: readonly Lie[],
  below: Below,
  sides: number,
): CornerSearch {
  if (sides === 0) return { corners: null, seeming: null };
  const over = below.corner === null ? null : spacesOverCorners(places, lies, sides);
  const found =
    over ??
    spacesOfOneKind(places, lies, sides, true) ??
    (below.corner === null ? spacesOfOneKind(places, lies, sides, false) : null) ??
    stitchesInCorners(places, below, sides);
  return found
    ? { corners: found, seeming: null }
    : { corners: null, seeming: seemingCorners(places, lies, below) };
}

function spacesOverCorners(
  places: readonly DraftPlace[],
  lies: readonly Lie[],
  sides: number,
): Corners | null {
  const byCorner = new Map<number, number>();
  places.forEach(({ kind, chains }, i) => {
    const corner = lies[i]?.corner ?? null;
    if (kind !== 'space' || corner === null) return;
    const best = byCorner.get(corner);
    if (best === undefined || (places[best]?.chains ?? 0) < chains) byCorner.set(corner, i);
  });
  if (byCorner.size !== sides) return null;
  return ofSpaces(
    places,
    lies,
    [...byCorner.values()].sort((a, b) => a - b),
  );
}

/** The kind of space with the most chains of which there are as many as sides. */
function spacesOfOneKind(
  places: readonly DraftPlace[],
  lies: readonly Lie[],
  sides: number,
  inPlaceOnly: boolean,
): Corners | null {
  const byKind = spacesByKind(places, lies, inPlaceOnly);
  const fitting = [...byKind.values()].filter((indices) => indices.length === sides);
  const chainsOf = (indices: readonly number[]): number => places[indices[0] ?? 0]?.chains ?? 0;
  fitting.sort((a, b) => chainsOf(b) - chainsOf(a));
  return fitting[0] ? ofSpaces(places, lies, fitting[0]) : null;
}

function spacesByKind(places: readonly DraftPlace[], lies: readonly Lie[], inPlaceOnly: boolean) {
  const byKind = new Map<string, number[]>();
  places.forEach(({ kind, code }, i) => {
    if (kind !== 'space' || (inPlaceOnly && !lies[i]?.inPlace)) return;
    const same = byKind.get(code);
    if (same) same.push(i);
    else byKind.set(code, [i]);
  });
  return byKind;
}

function ofSpaces(
  places: readonly DraftPlace[],
  lies: readonly Lie[],
  indices: readonly number[],
): Corners {
  const numbers = indices.map((index, i) => lies[index]?.corner ?? i);
  return {
    corner: { kind: 'space', space: places[indices[0] ?? 0]?.code ?? '' },
    places: indices,
    numbers: distinct(numbers),
  };
}

/** The middle stitch of those in each corner below; where there is none, of those three or more in one place. */
function stitchesInCorners(
  places: readonly DraftPlace[],
  below: Below,
  sides: number,
): Corners | null {
  const together = stitchesByPlace(places);
  const most = [...together.values()].reduce((best, { length }) => Math.max(best, length), 0);
  const groups = [...together.entries()].filter(([into, { length }]) =>
    below.corner === null
      ? length === most && most >= 3 && below.kind === 'places'
      : (below.places[into]?.corner ?? null) !== null,
  );
  if (groups.length !== sides) return null;
  const middles = groups
    .map(([into, indices]) => ({ at: indices[Math.floor(indices.length / 2)] ?? 0, into }))
    .sort((a, b) => a.at - b.at);
  return {
    corner: { kind: 'stitch', code: places[middles[0]?.at ?? 0]?.code ?? '' },
    places: middles.map(({ at }) => at),
    numbers: distinct(middles.map(({ into }, i) => below.places[into]?.corner ?? i)),
  };
}

/** Stitches by the place below, which a round may begin in and end in. */
function stitchesByPlace(places: readonly DraftPlace[]): Map<number, number[]> {
  const together = new Map<number, number[]>();
  places.forEach(({ kind, into }, i) => {
    if (kind !== 'stitch' || into < 0) return;
    const same = together.get(into);
    if (same) same.push(i);
    else together.set(into, [i]);
  });
  return together;
}

/** Each corner once; in the order of making where the round below does not tell them apart. */
function distinct(numbers: readonly number[]): number[] {
  return new Set(numbers).size === numbers.length ? [...numbers] : numbers.map((_, i) => i);
}

function seemingCorners(
  places: readonly DraftPlace[],
  lies: readonly Lie[],
  below: Below,
): CornerSearch['seeming'] {
  const kinds = [...spacesByKind(places, lies, true).entries()];
  kinds.sort(([, a], [, b]) => (places[b[0] ?? 0]?.chains ?? 0) - (places[a[0] ?? 0]?.chains ?? 0));
  if (kinds[0]) return { count: kinds[0][1].length, what: `${kinds[0][0]} sps` };
  if (below.kind !== 'places') return null;
  const groups = [...stitchesByPlace(places).values()].filter(({ length }) => length >= 3);
  return groups.length > 0 ? { count: groups.length, what: 'places with 3 stitches' } : null;
}

/** The places of a round with their sides and corners, as the next round meets them. */
export function placesOf(
  drafts: readonly DraftPlace[],
  lies: readonly Lie[],
  corners: Corners | null,
  sides: number,
): Place[] {
  const numberAt = new Map(corners?.places.map((at, i) => [at, corners.numbers[i] ?? i]));
  const forward =
    !corners || sides < 3 || corners.numbers[1] === ((corners.numbers[0] ?? 0) + 1) % sides;
  let last = corners?.numbers.at(-1) ?? 0;
  return drafts.map(({ kind, code, chains }, i): Place => {
    const corner = numberAt.get(i) ?? null;
    if (corner !== null) last = corner;
    const side = !corners ? 0 : forward ? (last + 1) % sides : last;
    return { kind, code, chains, side, corner, width: lies[i]?.width ?? 1 };
  });
}

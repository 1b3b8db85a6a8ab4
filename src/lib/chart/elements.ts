import type { Gauge } from '../gauge/gauge';
import type { WorkedRound, WorkedStitch } from '../pattern/reading';
import { stitch } from '../stitches/stitchTable';

/** A stitch, or the chains that stand in place of one: it has a foot and a head. */
export interface Column {
  readonly kind: 'column';
  /** Indices of the worked stitches it is made of. */
  readonly members: readonly number[];
  /** US code of what it counts as; "ch" for a turning chain that counts as nothing. */
  readonly code: string;
  readonly beginning: 'standing' | 'turning' | null;
  /** Legs of a decrease that stand side by side; 1 for any other stitch. */
  readonly legs: number;
  readonly place: number | null;
  readonly corner: number | null;
  readonly widthMm: number;
}

/** Chains from one head to the next, or a tall joining stitch laid in place of them. */
export interface Loop {
  readonly kind: 'loop';
  readonly members: readonly number[];
  readonly place: number | null;
  readonly corner: number | null;
  readonly widthMm: number;
}

export type RoundElement = Column | Loop;

/** A picot on what was made before it: element `on`, -1 at the very beginning, after so many of its stitches. */
export interface Picot {
  readonly members: readonly number[];
  readonly on: number;
  readonly after: number;
}

export interface RoundElements {
  readonly elements: readonly RoundElement[];
  readonly picots: readonly Picot[];
  /** Slip stitches into places of the round below: a walk to where the round begins, a new yarn. */
  readonly travel: readonly number[];
  /** The slip stitch that closes the round. */
  readonly join: number | null;
}

/** Width along the round of a chain that stands upright before a stitch, in stitch widths: ours. */
const TURNING_WIDTH = 0.6;
/** Width of stitches of many legs, and of those whose legs bulge: ours. */
const THICK_WIDTH = { legs: 1.25, popcorn: 1.5 } as const;
/** A long loop bows out instead of taking all of its length along the round: ours. */
const LOOP_WIDTHS = { most: 2.7, share: 0.55 } as const;

/** Groups the stitches of a round to what stands beside one another along it. */
export function elementsOf(
  round: WorkedRound,
  { stitchWidthMm }: Gauge,
  sides: number,
): RoundElements {
  const { stitches, places } = round;
  const elements: RoundElement[] = [];
  const picots: Picot[] = [];
  const travel: number[] = [];
  let join: number | null = null;
  for (let i = 0, end = 0; i < stitches.length; i = end) {
    const first = stitches[i] as WorkedStitch;
    const at = i;
    end = runEnd(stitches, i);
    const members = Array.from({ length: end - at }, (_, j) => at + j);
    const slips = first.code === 'sl st';
    if (first.role === 'travel' || (first.role === 'join' && first.into.kind !== 'round-start'))
      travel.push(...members);
    else if (first.role === 'join' && slips) join = at;
    else if (first.role === 'picot' || first.role === 'link') {
      const after = elements.at(-1)?.members.length ?? 0;
      picots.push({ members, on: elements.length - 1, after });
    } else if (first.role === 'space' || first.role === 'join') {
      // A tall stitch that closes the round makes the last space, which has the last place.
      const place = first.place ?? (first.role === 'join' ? places.length - 1 : null);
      const corner = first.corner ?? (place === null ? null : (places[place]?.corner ?? null));
      const chains = places[place ?? -1]?.chains ?? members.length;
      const widthMm = loopWidths(chains, corner === null ? 0 : sides) * stitchWidthMm;
      // A picot in the middle of a space does not part it.
      const last = elements.at(-1);
      const goesOn = last?.kind === 'loop' && last.place === place && place !== null;
      if (goesOn) elements.pop();
      const all = goesOn ? [...last.members, ...members] : members;
      elements.push({ kind: 'loop', members: all, place, corner, widthMm });
    } else elements.push(columnOf(round, first, members, stitchWidthMm));
  }
  return { elements, picots, travel, join };
}

/** A loop cuts off its corner, the more so the sharper it is, and so takes more of the two sides. */
function loopWidths(chains: number, sides: number): number {
  const widths = Math.min(0.9 * chains, Math.max(LOOP_WIDTHS.most, LOOP_WIDTHS.share * chains));
  return sides === 0 ? widths : widths * (0.6 + 0.4 / Math.cos(Math.PI / sides));
}

/** Where the run of stitches that belong to one element ends. */
function runEnd(stitches: readonly WorkedStitch[], begin: number): number {
  const first = stitches[begin] as WorkedStitch;
  let end = begin + 1;
  while (end < stitches.length && goesOn(first, stitches[end - 1], stitches[end])) end += 1;
  return end;
}

function goesOn(first: WorkedStitch, last?: WorkedStitch, next?: WorkedStitch): boolean {
  if (!last || !next) return false;
  switch (first.role) {
    case 'picot':
      return last.role === 'picot' && last.code === 'ch' && next.role === 'picot';
    case 'space':
      return (
        (next.role === 'space' && next.place === first.place) ||
        (next.role === 'join' && next.code !== 'sl st')
      );
    case 'standing':
    case 'turning':
      return next.role === first.role && next.place === first.place;
    default:
      return false;
  }
}

function columnOf(
  { places }: WorkedRound,
  first: WorkedStitch,
  members: readonly number[],
  stitchWidthMm: number,
): Column {
  const beginning = first.role === 'standing' || first.role === 'turning' ? first.role : null;
  const code =
    beginning === 'standing' ? (places[first.place ?? -1]?.code ?? first.code) : first.code;
  const isThick = beginning === null && (stitch(code)?.draws ?? 1) > 2;
  const thick = code.endsWith(' pc') ? THICK_WIDTH.popcorn : THICK_WIDTH.legs;
  const widths = beginning === 'turning' ? TURNING_WIDTH : isThick ? thick : 1;
  return {
    kind: 'column',
    members,
    code,
    beginning,
    legs: Number(/(\d+)tog$/.exec(code)?.[1] ?? 1),
    place: first.place,
    corner: first.corner,
    widthMm: widths * stitchWidthMm,
  };
}

import { roundHeightMm } from '../motifs/geometry';
import type { Gauge } from '../gauge/gauge';
import { stitch } from '../stitches/stitchTable';
import type { ArrangedRound } from './arranged';
import type { Column } from './elements';
import type { Ground } from './ground';
import { add, between, distance, towards, type Point } from './point';

/** Room between a head and the outline, in stitch widths: ours. */
const BELOW_OUTLINE = 0.07;
/** Room that the end of a loop takes beside a head, in stitch widths: ours. */
const LOOP_END = 1.3;
/** How much higher a turning chain stands over the slip stitches that led to it. */
const OVER_WALK = 0.5;
/** Height of a chain that stands for nothing, in stitch widths: ours. */
export const UPRIGHT_CHAIN = 0.75;

/** Where each element of a round ends: as high as its own stitch, the tallest on the outline. */
export function headsOf(arranged: ArrangedRound, ground: Ground): Point[] {
  const { elements, alongs, round, travel } = arranged;
  const { gauge } = ground;
  const roundMm = roundHeightMm(round, gauge);
  return elements.map((element, i) => {
    const inner = ground.inner(alongs[i] ?? 0);
    const isFull = ground.reshapes || element.kind === 'loop';
    const overMm = travel.length > 0 ? OVER_WALK * gauge.stitchWidthMm : 0;
    const level = isFull ? 1 : Math.min(1, heightMm(element, gauge, roundMm, overMm) / roundMm);
    const head = between(inner, ground.outer(alongs[i] ?? 0), level);
    return add(head, towards(head, inner), BELOW_OUTLINE * gauge.stitchWidthMm);
  });
}

function heightMm(
  { beginning, members, code }: Column,
  gauge: Gauge,
  roundMm: number,
  overMm: number,
): number {
  if (beginning === 'turning') return UPRIGHT_CHAIN * gauge.stitchWidthMm * members.length + overMm;
  return stitch(code) ? gauge.heightMm(code) : roundMm;
}

/** Symbols keep their width where there is room, and give way where heads stand close. */
export function unitsOf(
  { elements }: ArrangedRound,
  heads: readonly Point[],
  { gauge, isClosed }: Ground,
): number[] {
  const count = elements.length;
  const roomBeside = (i: number, j: number): number => {
    if (count < 2 || (!isClosed && (j < 0 || j >= count))) return 1;
    const [own, other] = [elements[i], elements[(j + count) % count]];
    // Of a loop only its end is beside: its chains give way.
    const mostMm = other?.kind === 'loop' ? LOOP_END * gauge.stitchWidthMm : Infinity;
    const naturalMm = ((own?.widthMm ?? 0) + Math.min(mostMm, other?.widthMm ?? 0)) / 2;
    return distance(heads[i] as Point, heads[(j + count) % count] as Point) / naturalMm;
  };
  return elements.map((_, i) => {
    const room = Math.min(roomBeside(i, i - 1), roomBeside(i, i + 1));
    return gauge.stitchWidthMm * Math.min(1.05, Math.max(0.45, room));
  });
}

/** The heads that a loop hangs between; a row ends where its last loop does. */
export function loopEnds(
  index: number,
  { elements, alongs, direction }: ArrangedRound,
  heads: readonly Point[],
  { isClosed, outer }: Ground,
): [Point, Point] {
  const count = elements.length;
  const find = (step: 1 | -1): Point => {
    for (let walked = 1; walked < count; walked += 1) {
      const j = index + step * walked;
      if (!isClosed && (j < 0 || j >= count)) break;
      const at = (j + count) % count;
      if (elements[at]?.kind === 'column') return heads[at] as Point;
    }
    const half = isClosed ? 0.5 / Math.max(1, count) : (elements[index]?.widthMm ?? 0) / 2;
    return outer((alongs[index] ?? 0) + step * direction * half);
  };
  return [find(-1), find(1)];
}

import type { Gauge } from '../gauge/gauge';
import type { Motif, MotifSides } from './motif';
import { fixed, polygonPoints } from './polygonPoints';
import { placedRounds, type PlacedRound } from './stitchPlaces';

/** A round as a drawing has it: paths in mm about the middle, in the notation of SVG. */
export interface RoundStrokes {
  readonly label: string;
  /** The fabric behind the stitches: what shows through between them. */
  readonly ground: string;
  /** Every stitch a strand. */
  readonly strands: string;
  readonly strandMm: number;
}

/** The rounds of a motif `acrossMm` wide as paths, from the middle out. */
export const motifStrokes = (motif: Motif, gauge: Gauge, acrossMm: number): RoundStrokes[] =>
  placedRounds(motif, gauge, acrossMm).map((round) => ({
    label: round.label,
    ground: groundOf(round, motif.sides),
    strands: round.stitches
      .map(({ foot, head }) => `M${at(foot, head, 0.1)}L${at(foot, head, 0.93)}`)
      .join(''),
    strandMm: strandMm(round, motif.sides),
  }));

function groundOf({ shape, outerMm }: PlacedRound, sides: MotifSides): string {
  if (shape === 'circle' || sides === 0) {
    const r = fixed(outerMm);
    return `M-${r} 0a${r} ${r} 0 1 0 ${fixed(2 * outerMm)} 0a${r} ${r} 0 1 0 -${fixed(2 * outerMm)} 0Z`;
  }
  return `M${polygonPoints(sides, outerMm)}Z`;
}

/** As wide as the stitches stand apart, less a thread of shadow. */
function strandMm({ outerMm, innerMm, stitches, shape }: PlacedRound, sides: MotifSides): number {
  const middleMm = (outerMm + innerMm) / 2;
  const roundMm =
    shape === 'circle' ? 2 * Math.PI * middleMm : 2 * sides * middleMm * Math.tan(Math.PI / sides);
  return Math.min(0.78 * (roundMm / Math.max(1, stitches.length)), 0.6 * (outerMm - innerMm));
}

type Point = readonly [number, number];
const at = (from: Point, to: Point, share: number): string =>
  `${fixed(from[0] + share * (to[0] - from[0]))} ${fixed(from[1] + share * (to[1] - from[1]))}`;

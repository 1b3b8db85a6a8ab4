import type { Gauge } from '../../lib/gauge/gauge';
import type { Motif, MotifSides } from '../../lib/motifs/motif';
import { placedRounds, type PlacedRound } from '../../lib/motifs/stitchPlaces';
import { fixed, polygonPoints } from './polygonPoints';

interface MotifDrawingProps {
  motif: Motif;
  gauge: Gauge;
  /** Flat to flat, in mm. */
  acrossMm: number;
  /** sRGB of each round. */
  roundHexes: readonly string[];
}

/** A motif from its real rounds, every stitch a strand; centred on 0,0 in mm. For use inside an svg. */
export function MotifDrawing({ motif, gauge, acrossMm, roundHexes }: MotifDrawingProps) {
  const rounds = placedRounds(motif, gauge, acrossMm);
  return (
    <g className="keeps-colour">
      {rounds.toReversed().map((round, i) => {
        const hex = roundHexes[rounds.length - 1 - i] ?? '#888888';
        return <RoundDrawing key={round.label} {...{ round, hex }} sides={motif.sides} />;
      })}
    </g>
  );
}

function RoundDrawing({
  round,
  hex,
  sides,
}: {
  round: PlacedRound;
  hex: string;
  sides: MotifSides;
}) {
  const stitches = round.stitches
    .map(({ foot, head }) => `M${at(foot, head, 0.1)}L${at(foot, head, 0.93)}`)
    .join('');
  return (
    <>
      <path d={outline(round, sides)} fill={`color-mix(in oklab, ${hex} 62%, #10181a)`} />
      <path
        d={stitches}
        stroke={hex}
        strokeWidth={fixed(strandMm(round, sides))}
        strokeLinecap="round"
        fill="none"
      />
    </>
  );
}

/** The fabric behind the stitches of a round: what shows through between them. */
function outline({ shape, outerMm }: PlacedRound, sides: MotifSides): string {
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

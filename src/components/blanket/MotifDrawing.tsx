import type { Gauge } from '../../lib/gauge/gauge';
import type { Motif } from '../../lib/motifs/motif';
import { motifStrokes } from '../../lib/motifs/motifStrokes';
import { fixed } from '../../lib/motifs/polygonPoints';
import { shadeOf } from './shadeOf';

interface MotifDrawingProps {
  motif: Motif;
  gauge: Gauge;
  /** As `MotifGeometry.acrossMm`. */
  acrossMm: number;
  /** sRGB of each round. */
  roundHexes: readonly string[];
}

/** A motif from its real rounds, every stitch a strand; centred on 0,0 in mm. For use inside an svg. */
export function MotifDrawing({ motif, gauge, acrossMm, roundHexes }: MotifDrawingProps) {
  const rounds = motifStrokes(motif, gauge, acrossMm);
  return (
    <g className="keeps-colour">
      {rounds.toReversed().map(({ label, ground, strands, strandMm }, i) => {
        const hex = roundHexes[rounds.length - 1 - i] ?? '#888888';
        return (
          <g key={label}>
            <path d={ground} fill={shadeOf(hex)} />
            <path
              d={strands}
              stroke={hex}
              strokeWidth={fixed(strandMm)}
              strokeLinecap="round"
              fill="none"
            />
          </g>
        );
      })}
    </g>
  );
}

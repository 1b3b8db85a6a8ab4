import type { Gauge } from '../../lib/gauge/gauge';
import { motifGeometry } from '../../lib/motifs/geometry';
import type { Motif } from '../../lib/motifs/motif';
import { showFabric, type Units } from '../../lib/units/display';
import { MotifDrawing } from '../blanket/MotifDrawing';
import { RuledFrame } from '../ui/RuledFrame';
import { acrossWord, roundHexes, SHAPE_WORDS } from './motifWords';

interface MotifPictureProps {
  motif: Motif;
  gauge: Gauge;
  units: Units;
  maxHeightPx?: number;
  className?: string;
}

/** A motif to scale under the rule. */
export function MotifPicture({ motif, gauge, units, maxHeightPx, className }: MotifPictureProps) {
  const { acrossMm } = motifGeometry(motif, gauge, null);
  const { widthMm, heightMm, topMm } = boxOf(motif.sides, acrossMm);
  return (
    <RuledFrame
      {...{ widthMm, heightMm, units, maxHeightPx, className }}
      label={`${motif.name}, a ${SHAPE_WORDS[motif.sides]} of ${motif.rounds.length} rounds, drawn to scale: ${showFabric(acrossMm, units)} ${acrossWord(motif.sides)}.`}
    >
      <g transform={`translate(${widthMm / 2} ${topMm})${motif.sides === 3 ? ' rotate(180)' : ''}`}>
        <MotifDrawing {...{ motif, gauge, acrossMm }} roundHexes={roundHexes(motif)} />
      </g>
    </RuledFrame>
  );
}

/** The box round a motif that stands on a side, and how far down its middle lies, in mm. */
export function boxOf(sides: number, acrossMm: number) {
  if (sides === 3) {
    return {
      widthMm: (acrossMm * 2) / Math.sqrt(3),
      heightMm: acrossMm,
      topMm: (2 * acrossMm) / 3,
    };
  }
  const widthMm = sides === 6 ? acrossMm / Math.cos(Math.PI / 6) : acrossMm;
  return { widthMm, heightMm: acrossMm, topMm: acrossMm / 2 };
}

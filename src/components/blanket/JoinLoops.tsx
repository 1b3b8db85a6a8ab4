import type { Join } from '../../lib/joins/join';
import type { MotifSides } from '../../lib/motifs/motif';

interface JoinLoopsProps {
  join: Join;
  sides: MotifSides;
  acrossMm: number;
  seamMm: number;
  sideStitches: number;
  hex: string;
}

/** What a join adds round one motif: a closed band, or a row of loops that reach half the seam. */
export function JoinLoops({ join, sides, acrossMm, seamMm, sideStitches, hex }: JoinLoopsProps) {
  const halfMm = acrossMm / 2;
  const corners = sides === 0 ? 4 : sides;
  const sideMm = 2 * halfMm * Math.tan(Math.PI / corners);
  if (join.openness === 'closed') {
    return <Band {...{ corners, hex }} apothemMm={halfMm + seamMm / 2} />;
  }
  const loops = Math.max(1, Math.round((sideStitches - join.fit.plus) / join.fit.multipleOf));
  const stepMm = sideMm / loops;
  const path = Array.from({ length: loops }, (_, i) => {
    const x = -sideMm / 2 + i * stepMm;
    return `M${x.toFixed(2)} ${-halfMm}q${(stepMm / 2).toFixed(2)} ${(-seamMm).toFixed(2)} ${stepMm.toFixed(2)} 0`;
  }).join('');
  return (
    <g className="keeps-colour" fill="none" stroke={hex} strokeWidth={Math.max(1.2, stepMm / 6)}>
      {Array.from({ length: corners }, (_, side) => (
        <path key={side} d={path} transform={`rotate(${(360 * side) / corners})`} />
      ))}
    </g>
  );
}

function Band({ corners, apothemMm, hex }: { corners: number; apothemMm: number; hex: string }) {
  const reach = apothemMm / Math.cos(Math.PI / corners);
  const points = Array.from({ length: corners }, (_, i) => {
    const angle = (2 * Math.PI * (i + 0.5)) / corners;
    return `${(reach * Math.sin(angle)).toFixed(2)},${(-reach * Math.cos(angle)).toFixed(2)}`;
  });
  return <polygon className="keeps-colour" points={points.join(' ')} fill={hex} />;
}

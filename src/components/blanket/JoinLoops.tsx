import type { Join } from '../../lib/joins/join';
import { apothemsAcross } from '../../lib/motifs/geometry';
import type { MotifSides } from '../../lib/motifs/motif';
import { fixed, polygonPoints } from '../../lib/motifs/polygonPoints';

interface JoinLoopsProps {
  join: Join;
  sides: MotifSides;
  acrossMm: number;
  seamMm: number;
  sideStitches: number;
  hex: string;
}

/** The fabric of a join round one motif: a closed band, or loops over what shows through them. */
export function JoinLoops({ join, sides, acrossMm, seamMm, sideStitches, hex }: JoinLoopsProps) {
  const apothemMm = acrossMm / apothemsAcross(sides);
  const corners = sides === 0 ? 4 : sides;
  const sideMm = 2 * apothemMm * Math.tan(Math.PI / corners);
  const closed = join.openness === 'closed';
  const loops = Math.max(1, Math.round((sideStitches - join.fit.plus) / join.fit.multipleOf));
  const stepMm = sideMm / loops;
  const path = Array.from(
    { length: loops },
    (_, i) =>
      `M${fixed(i * stepMm - sideMm / 2)} ${fixed(-apothemMm)}q${fixed(stepMm / 2)} ${fixed(-seamMm)} ${fixed(stepMm)} 0`,
  ).join('');
  return (
    <g className="keeps-colour">
      <polygon
        points={polygonPoints(corners, apothemMm + seamMm / 2)}
        fill={closed ? hex : `color-mix(in oklab, ${hex} 70%, #10181a)`}
      />
      {!closed && (
        <g fill="none" stroke={hex} strokeWidth={fixed(Math.max(1.2, stepMm / 6))}>
          {Array.from({ length: corners }, (_, side) => (
            <path key={side} d={path} transform={`rotate(${(360 * side) / corners})`} />
          ))}
        </g>
      )}
    </g>
  );
}

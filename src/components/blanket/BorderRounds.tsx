import { useId } from 'react';
import type { Estimate } from '../../lib/ledger/ledger';
import { fixed } from '../../lib/motifs/polygonPoints';
import type { BlanketMotif } from '../../lib/plan/blanketFaces';
import { borderBands, MITRE_LIMIT, outerOutlines } from '../../lib/plan/borderBands';
import type { Plan } from '../../lib/plan/plan';
import { hexOf } from '../../lib/plan/hexOf';

interface BorderRoundsProps {
  plan: Plan;
  estimate: Estimate;
  motifs: readonly BlanketMotif[];
}

/** Border rounds from the outside in, along whatever edge there is. For use inside an svg in mm. */
export function BorderRounds({ plan, estimate, motifs }: BorderRoundsProps) {
  const id = useId();
  const bands = borderBands(plan, estimate);
  if (bands.length === 0) return null;
  return (
    <g className="keeps-colour" strokeLinejoin="miter" strokeMiterlimit={MITRE_LIMIT}>
      <defs>
        <path id={id} d={outerOutlines(motifs)} />
      </defs>
      {bands.map(({ reachMm, colour }, i) => (
        <use
          key={i}
          href={`#${id}`}
          fill={hexOf(plan, colour)}
          stroke={hexOf(plan, colour)}
          strokeWidth={fixed(2 * reachMm)}
        />
      ))}
    </g>
  );
}

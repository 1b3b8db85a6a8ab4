import { useId } from 'react';
import { gaugeOf } from '../../lib/gauge/gauge';
import { SLOT_FACTS } from '../../lib/layout/face';
import type { Estimate } from '../../lib/ledger/ledger';
import { fixed } from '../../lib/motifs/polygonPoints';
import { blanketFaces } from '../../lib/plan/blanketFaces';
import type { Plan } from '../../lib/plan/plan';
import { ColourwayDrawing } from '../blanket/ColourwayDrawing';

interface FourMotifsProps {
  /** A plan of two by two, and its estimate. */
  plan: Plan;
  estimate: Estimate;
}

/** Motifs joined, from their real rounds. For use inside an svg in mm. */
export function FourMotifs({ plan, estimate }: FourMotifsProps) {
  const id = useId();
  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  const motifs = blanketFaces(plan, estimate).motifs.filter(
    ({ face }) => SLOT_FACTS[face.slot].share === 1,
  );
  const used = [...new Set(motifs.map(({ colourway }) => colourway))];
  return (
    <>
      <defs>
        {used.map((colourway) => (
          <g key={colourway} id={`${id}w${colourway}`}>
            <ColourwayDrawing {...{ plan, estimate, gauge }} index={colourway} />
          </g>
        ))}
      </defs>
      {motifs.map(({ face, colourway, centreMm: [x, y] }, i) => (
        <use
          key={i}
          href={`#${id}w${colourway}`}
          transform={`translate(${fixed(x)} ${fixed(y)}) rotate(${face.turnDeg})`}
        />
      ))}
    </>
  );
}

import type { Gauge } from '../../lib/gauge/gauge';
import { readyJoin } from '../../lib/joins/readyJoins';
import type { Estimate } from '../../lib/ledger/ledger';
import { joinStitches } from '../../lib/ledger/pieces';
import type { Motif } from '../../lib/motifs/motif';
import type { Plan } from '../../lib/plan/plan';
import { hexOf } from '../../lib/plan/hexOf';
import { JoinLoops } from './JoinLoops';
import { MotifDrawing } from './MotifDrawing';

interface ColourwayDrawingProps {
  plan: Plan;
  estimate: Estimate;
  gauge: Gauge;
  index: number;
}

/** A motif in one colourway on its share of the fabric of the join, centred on 0,0 in mm. */
export function ColourwayDrawing({ plan, estimate, gauge, index }: ColourwayDrawingProps) {
  const colourway = plan.colourways[index];
  const motifIndex = colourway?.motifIndex ?? 0;
  const motif = plan.motifs[motifIndex] as Motif;
  const acrossMm = estimate.motifs[motifIndex]?.acrossMm ?? 0;
  const join = readyJoin(plan.join.key);
  return (
    <>
      {join && (
        <JoinLoops
          join={join}
          sides={motif.sides}
          acrossMm={acrossMm}
          seamMm={estimate.size.seamMm}
          sideStitches={joinStitches(motif)}
          hex={hexOf(plan, plan.join.colour)}
        />
      )}
      <MotifDrawing
        motif={motif}
        gauge={gauge}
        acrossMm={acrossMm}
        roundHexes={colourway?.roundColours.map((key) => hexOf(plan, key)) ?? []}
      />
    </>
  );
}

import { hexOf } from '../../lib/plan/hexOf';
import type { Estimate } from '../../lib/ledger/ledger';
import { motifKeyOf } from '../../lib/making/madeMotifs';
import type { BlanketMotif } from '../../lib/plan/blanketFaces';
import type { Plan } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import { RuledFrame } from '../ui/RuledFrame';

interface MakingMapProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  motifs: readonly BlanketMotif[];
  made: ReadonlySet<string>;
  /** Number of the motif at hand. */
  current: number;
  onChoose: (face: number) => void;
}

/** Where one is: made motifs in their colours, the one at hand framed, the others as outlines. */
export function MakingMap(props: MakingMapProps) {
  const { plan, estimate, units, motifs, made, current, onChoose } = props;
  const { widthMm, heightMm } = estimate.size;
  const here = motifs[current];
  return (
    <RuledFrame
      {...{ widthMm, heightMm, units }}
      maxHeightPx={460}
      label={`Map of the blanket: ${made.size} of ${motifs.length} motifs made. The list beneath says the same.`}
    >
      {motifs.map((motif, i) => {
        const isMade = made.has(motifKeyOf(motif.face));
        const rounds = plan.colourways[motif.colourway]?.roundColours ?? [];
        return (
          <g key={i} onClick={() => onChoose(i)} className="cursor-pointer">
            <polygon
              points={pointsOf(motif)}
              className={isMade ? 'stroke-line' : 'fill-surface stroke-edge'}
              fill={isMade ? hexOf(plan, rounds.at(-1) ?? '') : undefined}
              vectorEffect="non-scaling-stroke"
            />
            {isMade && (
              <circle
                cx={motif.centreMm[0]}
                cy={motif.centreMm[1]}
                r={widthOf(motif) / 5}
                fill={hexOf(plan, rounds[Math.floor(rounds.length / 2)] ?? '')}
              />
            )}
          </g>
        );
      })}
      {here && (
        <polygon
          points={pointsOf(here)}
          className="pointer-events-none fill-none stroke-teal"
          strokeWidth={4}
          vectorEffect="non-scaling-stroke"
        />
      )}
    </RuledFrame>
  );
}

const pointsOf = ({ outlineMm }: BlanketMotif): string =>
  outlineMm.map((point) => point.map((mm) => Math.round(mm * 10) / 10).join()).join(' ');

function widthOf({ outlineMm }: BlanketMotif): number {
  const xs = outlineMm.map(([x]) => x);
  return Math.max(...xs) - Math.min(...xs);
}

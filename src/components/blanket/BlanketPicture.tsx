import { lazy, Suspense, useId } from 'react';
import { gaugeOf } from '../../lib/gauge/gauge';
import { fixed } from '../../lib/motifs/polygonPoints';
import type { Estimate } from '../../lib/ledger/ledger';
import { layoutFacts } from '../../lib/layout/layouts';
import { SLOT_FACTS } from '../../lib/layout/face';
import { blanketFaces, type BlanketMotif } from '../../lib/plan/blanketFaces';
import { mainMotif, type Plan } from '../../lib/plan/plan';
import { showSize, type Units } from '../../lib/units/display';
import { RuledFrame } from '../ui/RuledFrame';
import { useIsHere } from '../ui/useIsHere';
import { BorderRounds } from './BorderRounds';
import { ColourwayDrawing } from './ColourwayDrawing';

const PaintedImage = lazy(() => import('./PaintedImage'));

interface BlanketPictureProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  maxHeightPx?: number;
}

/** Up to so many motifs each is an object of its own; more are painted once into an image. */
const MOST_OBJECTS = 600;

/** The blanket to scale under the rule, from its real rounds and colours. */
export function BlanketPicture({ plan, estimate, units, maxHeightPx }: BlanketPictureProps) {
  const { size, rows, columns, layout } = estimate;
  const isHere = useIsHere();
  const motifWord = mainMotif(plan).name.toLowerCase();
  const { motifs } = blanketFaces(plan, estimate);
  const unit = layoutFacts(layout).unit === 'blocks' ? 'blocks of ' : 'of ';
  return (
    <RuledFrame
      widthMm={size.widthMm}
      heightMm={size.heightMm}
      units={units}
      maxHeightPx={maxHeightPx}
      label={`The blanket to scale: ${columns} by ${rows} ${unit}${motifWord}, ${showSize(size.widthMm, size.heightMm, units)} finished.`}
    >
      <BorderRounds {...{ plan, estimate, motifs }} />
      {motifs.length > MOST_OBJECTS ? (
        isHere && (
          <Suspense>
            <PaintedImage {...{ plan, estimate, motifs }} />
          </Suspense>
        )
      ) : (
        <MotifObjects {...{ plan, estimate, motifs }} />
      )}
    </RuledFrame>
  );
}

/** Each colourway is drawn once and used wherever it lies; half motifs are cut to their outline. */
function MotifObjects({
  plan,
  estimate,
  motifs,
}: {
  plan: Plan;
  estimate: Estimate;
  motifs: readonly BlanketMotif[];
}) {
  const id = useId();
  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  const parts = motifs.flatMap((motif, i) => (SLOT_FACTS[motif.face.slot].share < 1 ? [i] : []));
  return (
    <>
      <defs>
        {plan.colourways.map((_, i) => (
          <g key={i} id={`${id}w${i}`}>
            <ColourwayDrawing {...{ plan, estimate, gauge }} index={i} />
          </g>
        ))}
        {parts.map((i) => (
          <clipPath key={i} id={`${id}c${i}`}>
            <polygon points={pointsOf(motifs[i] as BlanketMotif)} />
          </clipPath>
        ))}
      </defs>
      {motifs.map(({ face, colourway, centreMm: [x, y] }, i) => {
        const turn = face.turnDeg === 0 ? '' : ` rotate(${face.turnDeg})`;
        const use = (
          <use
            key={i}
            href={`#${id}w${colourway}`}
            transform={`translate(${fixed(x)} ${fixed(y)})${turn}`}
          />
        );
        return SLOT_FACTS[face.slot].share === 1 ? (
          use
        ) : (
          <g key={i} clipPath={`url(#${id}c${i})`}>
            {use}
          </g>
        );
      })}
    </>
  );
}

const pointsOf = ({ outlineMm }: BlanketMotif): string =>
  outlineMm.map(([x, y]) => `${fixed(x)},${fixed(y)}`).join(' ');

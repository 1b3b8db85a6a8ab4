import { useId } from 'react';
import { gaugeOf } from '../../lib/gauge/gauge';
import { readyJoin } from '../../lib/joins/readyJoins';
import type { Estimate } from '../../lib/ledger/ledger';
import type { Motif } from '../../lib/motifs/motif';
import type { Plan } from '../../lib/plan/plan';
import { showSize, type Units } from '../../lib/units/display';
import { RuledFrame } from '../ui/RuledFrame';
import { JoinLoops } from './JoinLoops';
import { MotifDrawing } from './MotifDrawing';

interface BlanketPictureProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  maxHeightPx?: number;
}

/**
 * The blanket to scale under the rule. One row of colourways is drawn once as a pattern, and every
 * row is one rectangle filled with it, so a large blanket costs no more than a small one.
 */
export function BlanketPicture({ plan, estimate, units, maxHeightPx }: BlanketPictureProps) {
  const { size, rows, columns } = estimate;
  const motifWord = plan.motifs[0]?.name.toLowerCase() ?? 'motif';
  return (
    <RuledFrame
      widthMm={size.widthMm}
      heightMm={size.heightMm}
      units={units}
      maxHeightPx={maxHeightPx}
      label={`The blanket to scale: ${columns} by ${rows} of ${motifWord}, ${showSize(size.widthMm, size.heightMm, units)} finished.`}
    >
      <BorderRounds plan={plan} estimate={estimate} />
      <MotifRows plan={plan} estimate={estimate} />
    </RuledFrame>
  );
}

const hexOf = (plan: Plan, key: string | undefined): string =>
  plan.colours.find((colour) => colour.key === key)?.hex ?? '#888888';

/** Border rounds from the outside in, each a frame of its own colour. */
function BorderRounds({ plan, estimate: { size } }: { plan: Plan; estimate: Estimate }) {
  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  let inMm = 0;
  return (
    <g className="keeps-colour">
      {plan.border.toReversed().map(({ stitch, colour }, i) => {
        const frame = (
          <rect
            key={i}
            x={inMm}
            y={inMm}
            width={size.widthMm - 2 * inMm}
            height={size.heightMm - 2 * inMm}
            rx={gauge.stitchWidthMm}
            fill={hexOf(plan, colour)}
          />
        );
        inMm += gauge.heightMm(stitch);
        return frame;
      })}
      <rect
        x={size.borderMm}
        y={size.borderMm}
        width={size.widthMm - 2 * size.borderMm}
        height={size.heightMm - 2 * size.borderMm}
        fill={`color-mix(in oklab, ${hexOf(plan, plan.join.colour)} 70%, #10181a)`}
      />
    </g>
  );
}

function MotifRows({ plan, estimate }: { plan: Plan; estimate: Estimate }) {
  const id = useId();
  const { rows, columns, size, layout } = estimate;
  const acrossMm = Math.max(...estimate.motifs.map((motif) => motif.acrossMm));
  const pitchMm = acrossMm + size.seamMm;
  const hexagons = layout === 'offset-hexagons';
  const sideMm = acrossMm / Math.sqrt(3);
  const cellMm = hexagons ? 2 * sideMm : acrossMm;
  const rowMm = hexagons ? 1.5 * sideMm + (Math.sqrt(3) / 2) * size.seamMm : pitchMm;
  const count = plan.colourways.length;
  const bandMm = cellMm + size.seamMm;
  return (
    <>
      <defs>
        <pattern id={id} patternUnits="userSpaceOnUse" width={count * pitchMm} height={bandMm}>
          {plan.colourways.map((_, i) => (
            <g key={i} transform={`translate(${(i + 0.5) * pitchMm} ${bandMm / 2})`}>
              <Cell {...{ plan, estimate, acrossMm }} index={i} />
            </g>
          ))}
        </pattern>
      </defs>
      {Array.from({ length: rows }, (_, row) => {
        // Row r begins with colourway r: the pattern is drawn that many motifs further left.
        const shiftMm = (row % count) * pitchMm;
        const outsideMm = size.borderMm + size.edgeMm - size.seamMm / 2;
        const leftMm = outsideMm + (hexagons && row % 2 ? pitchMm / 2 : 0);
        const topMm = outsideMm + row * rowMm;
        return (
          <g key={row} transform={`translate(${leftMm - shiftMm} ${topMm})`}>
            <rect x={shiftMm} width={columns * pitchMm} height={bandMm} fill={`url(#${id})`} />
          </g>
        );
      })}
    </>
  );
}

/** One motif with the loops that join it. */
function Cell({
  plan,
  estimate,
  acrossMm,
  index,
}: BlanketParts & { acrossMm: number; index: number }) {
  const colourway = plan.colourways[index];
  const motif = plan.motifs[colourway?.motifIndex ?? 0] as Motif;
  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  const join = readyJoin(plan.join.key);
  return (
    <>
      {join && estimate.size.seamMm > 0 && (
        <JoinLoops
          join={join}
          sides={motif.sides}
          acrossMm={acrossMm}
          seamMm={estimate.size.seamMm}
          sideStitches={estimate.sideStitches}
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

interface BlanketParts {
  plan: Plan;
  estimate: Estimate;
}

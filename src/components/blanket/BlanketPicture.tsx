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
import { polygonPoints } from './polygonPoints';

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
function BorderRounds({ plan, estimate }: BlanketParts) {
  const { size, layout } = estimate;
  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  let inMm = 0;
  const rounds = plan.border.toReversed().map(({ stitch, colour }) => {
    const round = { inMm, hex: hexOf(plan, colour) };
    inMm += gauge.heightMm(stitch);
    return round;
  });
  if (layout === 'offset-hexagons') return <ToothedBorder {...{ estimate, rounds }} />;
  return (
    <g className="keeps-colour">
      {rounds.map(({ inMm: at, hex }) => (
        <rect
          key={at}
          x={at}
          y={at}
          width={size.widthMm - 2 * at}
          height={size.heightMm - 2 * at}
          rx={gauge.stitchWidthMm}
          fill={hex}
        />
      ))}
    </g>
  );
}

/** Round hexagons a border follows the teeth of the edge: each outer motif gets a larger outline beneath. */
function ToothedBorder({
  estimate,
  rounds,
}: {
  estimate: Estimate;
  rounds: readonly { inMm: number; hex: string }[];
}) {
  const { rows, columns, size } = estimate;
  const grid = gridOf(estimate);
  const outer = Array.from({ length: rows }, (_, row) =>
    Array.from({ length: columns }, (__, column) => ({ row, column })).filter(
      ({ column }) => row === 0 || row === rows - 1 || column === 0 || column === columns - 1,
    ),
  ).flat();
  return (
    <g className="keeps-colour">
      {rounds.map(({ inMm, hex }) =>
        outer.map(({ row, column }) => {
          const { xMm, yMm } = grid.centre(row, column);
          const apothemMm = grid.acrossMm / 2 + size.edgeMm + size.borderMm - inMm;
          return (
            <polygon
              key={`${inMm} ${row} ${column}`}
              points={polygonPoints(6, apothemMm)}
              transform={`translate(${xMm} ${yMm}) rotate(30)`}
              fill={hex}
            />
          );
        }),
      )}
    </g>
  );
}

function MotifRows({ plan, estimate }: BlanketParts) {
  const id = useId();
  const { rows, columns } = estimate;
  const { pitchMm, bandMm, left, top } = gridOf(estimate);
  const count = plan.colourways.length;
  return (
    <>
      <defs>
        <pattern id={id} patternUnits="userSpaceOnUse" width={count * pitchMm} height={bandMm}>
          {plan.colourways.map((_, i) => (
            <g key={i} transform={`translate(${(i + 0.5) * pitchMm} ${bandMm / 2})`}>
              <Cell {...{ plan, estimate }} index={i} />
            </g>
          ))}
        </pattern>
      </defs>
      {Array.from({ length: rows }, (_, row) => {
        // Row r begins with colourway r: the pattern is drawn that many motifs further left.
        const shiftMm = (row % count) * pitchMm;
        return (
          <g key={row} transform={`translate(${left(row) - shiftMm} ${top(row)})`}>
            <rect x={shiftMm} width={columns * pitchMm} height={bandMm} fill={`url(#${id})`} />
          </g>
        );
      })}
    </>
  );
}

/** Where the cells of the grid lie, each a motif with half a seam round it. */
function gridOf({ size, layout, motifs }: Estimate) {
  const acrossMm = Math.max(...motifs.map((motif) => motif.acrossMm));
  const pitchMm = acrossMm + size.seamMm;
  const hexagons = layout === 'offset-hexagons';
  const bandMm = hexagons ? (2 / Math.sqrt(3)) * pitchMm : pitchMm;
  const rowMm = hexagons ? 0.75 * bandMm : pitchMm;
  const edgeMm = size.borderMm + size.edgeMm - size.seamMm / 2;
  const left = (row: number) => edgeMm + (hexagons && row % 2 === 1 ? pitchMm / 2 : 0);
  const top = (row: number) => edgeMm + row * rowMm;
  const centre = (row: number, column: number) => ({
    xMm: left(row) + (column + 0.5) * pitchMm,
    yMm: top(row) + bandMm / 2,
  });
  return { acrossMm, pitchMm, bandMm, left, top, centre };
}

/** One motif, on its share of the fabric of the join. */
function Cell({ plan, estimate, index }: BlanketParts & { index: number }) {
  const colourway = plan.colourways[index];
  const motif = plan.motifs[colourway?.motifIndex ?? 0] as Motif;
  const acrossMm = estimate.motifs[colourway?.motifIndex ?? 0]?.acrossMm ?? 0;
  const join = readyJoin(plan.join.key);
  return (
    <g transform={motif.sides === 6 ? 'rotate(30)' : undefined}>
      {join && (
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
        gauge={gaugeOf(plan.swatch, plan.yarn.weightCategory)}
        acrossMm={acrossMm}
        roundHexes={colourway?.roundColours.map((key) => hexOf(plan, key)) ?? []}
      />
    </g>
  );
}

interface BlanketParts {
  plan: Plan;
  estimate: Estimate;
}

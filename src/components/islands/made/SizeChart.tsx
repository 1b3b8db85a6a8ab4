import { useId, type ReactNode } from 'react';
import type { MeasuredRound } from '../../../lib/motifs/measuredMotif';
import type { MotifSides } from '../../../lib/motifs/motif';
import { showFabric, type Units } from '../../../lib/units/display';
import { acrossWord } from '../../motifs/motifWords';
import { GUTTER_TOP_PX, Rule } from '../../ui/Rule';
import { HatchPattern } from '../../ui/StrandPattern';
import { useWidthPx } from '../../ui/useWidthPx';
import type { MadeFigures } from './madeFigures';

interface SizeChartProps {
  figures: MadeFigures;
  sides: MotifSides;
  units: Units;
}

const ROW_PX = 26;
const LABEL_PX = 64;
const END_PX = 6;
/** Two-sided 95 %: the standard normal quantile of 0.975. */
const Z95 = 1.96;

/** The size after each round under the rule: as measured over what the gauge says, each with its doubt. */
export function SizeChart({ figures, sides, units }: SizeChartProps) {
  const { computed, measured } = figures;
  const [ref, availablePx] = useWidthPx<HTMLElement>(420);
  const hatch = useId();
  const shown = measured ?? computed;
  const upTo = ({ acrossMm, acrossSdMm }: MeasuredRound) => acrossMm + Z95 * acrossSdMm;
  const mostMm = Math.max(...[...computed.rounds, ...shown.rounds].map(upTo));
  const pxPerMm = Math.max(60, availablePx - LABEL_PX - END_PX) / mostMm;
  const x = (acrossMm: number) => LABEL_PX + Math.max(0, acrossMm) * pxPerMm;
  const height = GUTTER_TOP_PX + ROW_PX * computed.rounds.length + 4;
  return (
    <figure ref={ref} className="w-full max-w-160">
      <svg
        role="img"
        aria-label={chartInWords(figures, sides, units)}
        width={availablePx}
        height={height}
        viewBox={`0 0 ${availablePx} ${height}`}
        className="keeps-colour block max-w-full"
      >
        <HatchPattern id={hatch} />
        <g className="fill-ink-2 stroke-ink-2 font-mono text-xs" aria-hidden>
          <text x={LABEL_PX - 10} y={GUTTER_TOP_PX - 8} textAnchor="end" stroke="none">
            {units === 'metric' ? 'cm' : 'in'}
          </text>
          <Rule along="top" lengthMm={shown.acrossMm} gutterPx={LABEL_PX} {...{ units, pxPerMm }} />
        </g>
        {computed.rounds.map((before, i) => (
          <g key={i} transform={`translate(0 ${GUTTER_TOP_PX + i * ROW_PX})`}>
            <text x="0" y="17" className="fill-ink text-sm">
              {before.label}
            </text>
            {measured && (
              <Bar round={before} look="gauge" {...{ x, hatch }} yPx={17} heightPx={4} />
            )}
            <Bar
              round={measured?.rounds[i] ?? before}
              look={measured ? 'made' : 'gauge'}
              {...{ x, hatch }}
              yPx={4}
              heightPx={11}
            />
          </g>
        ))}
      </svg>
      <figcaption className="mt-1 flex flex-wrap gap-x-4 text-sm text-ink-2">
        {measured && <Key look="made">as measured</Key>}
        <Key look="gauge">by the gauge</Key>
        {measured && <Key look="tape">the tape</Key>}
        <Key look="doubt">95&nbsp;% sure that it ends in here</Key>
      </figcaption>
    </figure>
  );
}

const LOOKS = { made: 'fill-teal-soft stroke-teal', gauge: 'fill-sunk stroke-edge' } as const;

interface BarProps {
  round: MeasuredRound;
  look: keyof typeof LOOKS;
  x: (acrossMm: number) => number;
  hatch: string;
  yPx: number;
  heightPx: number;
}

/** From the edge to where it surely reaches, then hatched to where it may; a line where the tape read. */
function Bar({ round, look, x, hatch, yPx, heightPx }: BarProps) {
  const { acrossMm, acrossSdMm, measuredMm } = round;
  const [from, to] = [x(acrossMm - Z95 * acrossSdMm), x(acrossMm + Z95 * acrossSdMm)];
  const box = { y: yPx, height: heightPx };
  return (
    <>
      <rect x={x(0)} width={Math.max(0, from - x(0))} {...box} className={LOOKS[look]} />
      <rect
        x={from}
        width={Math.max(2, to - from)}
        {...box}
        fill={`url(#${hatch})`}
        className="stroke-amber-ink"
      />
      {measuredMm !== null && (
        <line
          x1={x(measuredMm)}
          x2={x(measuredMm)}
          y1={yPx - 3}
          y2={yPx + heightPx + 3}
          strokeWidth="2"
          className="stroke-ink"
        />
      )}
    </>
  );
}

interface KeyProps {
  look: keyof typeof LOOKS | 'doubt' | 'tape';
  children: ReactNode;
}

function Key({ look, children }: KeyProps) {
  const id = useId();
  return (
    <span className="inline-flex items-center gap-1.5">
      <svg width={look === 'tape' ? 3 : 18} height="11" className="keeps-colour" aria-hidden>
        {look === 'doubt' && <HatchPattern id={id} />}
        {look === 'tape' ? (
          <line x1="1.5" x2="1.5" y2="11" strokeWidth="2" className="stroke-ink" />
        ) : (
          <rect
            x="0.5"
            y="0.5"
            width="17"
            height="10"
            {...(look === 'doubt'
              ? { fill: `url(#${id})`, className: 'stroke-amber-ink' }
              : { className: LOOKS[look] })}
          />
        )}
      </svg>
      {children}
    </span>
  );
}

function chartInWords({ computed, measured }: MadeFigures, sides: MotifSides, units: Units) {
  const rounds = computed.rounds.map(({ label, acrossMm }, i) => {
    const after = measured?.rounds[i];
    const gauge = showFabric(acrossMm, units);
    return after
      ? `${label} ${showFabric(after.acrossMm, units)}, by the gauge ${gauge}`
      : `${label} ${gauge}`;
  });
  return `Size ${acrossWord(sides)} after each round, to scale: ${rounds.join('; ')}.`;
}

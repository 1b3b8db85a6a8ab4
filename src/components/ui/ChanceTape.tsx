import { useId } from 'react';
import type { WeightCategory } from '../../lib/plan/plan';
import { bellPoints, chanceSentence, tapeNumbers, tapeSpan, type SkeinChance } from './chance';
import { classNames } from './classNames';
import { HatchPattern, StrandPattern } from './StrandPattern';
import { useWidthPx } from './useWidthPx';

interface ChanceTapeProps {
  /** The need, as a normal distribution. */
  meanM: number;
  sdM: number;
  /** Length of one skein. */
  skeinM: number;
  /** How many one owns or will buy: where the mark stands. */
  skeins: number;
  verb?: 'own' | 'buy';
  /** Chance of running short for each count of skeins, already worked out. */
  chances: readonly SkeinChance[];
  colour: string;
  weight: WeightCategory;
  className?: string;
}

const TOP = 18;
const BELL = 74;
const TAPE_Y = TOP + BELL;
const TAPE = 16;
/** Keeps the first and the last number on the drawing. */
const MARGIN = 8;
const HEIGHT = TAPE_Y + TAPE + 24;

/** How sure: what may be needed, over a tape of the yarn itself, ticked in whole skeins. */
export function ChanceTape(props: ChanceTapeProps) {
  const { meanM, sdM, skeinM, skeins, verb = 'own', chances, colour, weight, className } = props;
  const id = useId();
  const [ref, widthPx] = useWidthPx<HTMLElement>(300);

  const mean = meanM / skeinM;
  // A certain need is still drawn, as a spike two pixels wide.
  const sd = Math.max(sdM / skeinM, 1e-3);
  const span = tapeSpan(mean, sd, skeins);
  const pxPerSkein = (widthPx - 2 * MARGIN) / (span.toSkeins - span.fromSkeins);
  const x = (at: number) => Number((MARGIN + (at - span.fromSkeins) * pxPerSkein).toFixed(1));
  const markX = x(skeins);
  // The tape comes in from the left unless its own end is in sight.
  const tapeX = span.fromSkeins === 0 ? x(0) : 0;
  const curve = bellPoints(mean, sd, span)
    .map(({ skeins: at, height }) => `${x(at)} ${(TAPE_Y - BELL * height).toFixed(1)}`)
    .join('L');
  const area = `M${MARGIN} ${TAPE_Y}L${curve}L${widthPx - MARGIN} ${TAPE_Y}Z`;
  const sentence = chanceSentence(skeins, chances);
  const flagFlips = markX > widthPx - 56;

  return (
    <figure ref={ref} className={classNames('w-full', className)}>
      <svg
        role="img"
        aria-label={sentence}
        viewBox={`0 0 ${widthPx} ${HEIGHT}`}
        className="keeps-colour block h-auto w-full"
      >
        <StrandPattern id={`${id}yarn`} colour={colour} weight={weight} />
        <HatchPattern id={`${id}hatch`} />
        <clipPath id={`${id}enough`}>
          <rect width={markX} height={HEIGHT} />
        </clipPath>
        <clipPath id={`${id}short`}>
          <rect x={markX} width={Math.max(0, widthPx - markX)} height={HEIGHT} />
        </clipPath>

        <path d={area} clipPath={`url(#${id}enough)`} className="fill-teal-soft" />
        <path d={area} clipPath={`url(#${id}short)`} fill={`url(#${id}hatch)`} />
        <path d={`M${curve}`} fill="none" strokeWidth="2" className="stroke-teal" />

        <rect
          y={TAPE_Y}
          x={markX}
          width={Math.max(0, widthPx - markX)}
          height={TAPE}
          fill={`url(#${id}hatch)`}
        />
        <rect y={TAPE_Y} x={tapeX} width={markX - tapeX} height={TAPE} fill={`url(#${id}yarn)`} />
        <path
          d={`M${tapeX} ${TAPE_Y}H${widthPx}M${tapeX} ${TAPE_Y + TAPE}H${widthPx}`}
          className="stroke-edge"
        />

        <g className="fill-ink-2 stroke-ink-2 font-mono text-xs">
          {tapeNumbers(span, pxPerSkein).map((count) => (
            <g key={count} className={count === skeins ? 'fill-ink font-bold' : ''}>
              <line x1={x(count)} x2={x(count)} y1={TAPE_Y + TAPE} y2={TAPE_Y + TAPE + 6} />
              <text x={x(count)} y={TAPE_Y + TAPE + 19} textAnchor="middle" stroke="none">
                {count}
              </text>
            </g>
          ))}
        </g>

        <line
          x1={markX}
          x2={markX}
          y1={TOP - 12}
          y2={TAPE_Y + TAPE + 6}
          strokeWidth="2"
          className="stroke-ink"
        />
        <text
          x={markX + (flagFlips ? -6 : 6)}
          y={TOP - 1}
          textAnchor={flagFlips ? 'end' : 'start'}
          className="fill-ink text-sm font-bold"
        >
          {verb} {skeins}
        </text>
      </svg>
      <figcaption className="mt-1 text-ink-2">{sentence}</figcaption>
    </figure>
  );
}

import { Fragment, type ReactNode } from 'react';
import { classNames } from './classNames';
import { ruleEnd, ruleTicks, type RuleUnits } from './ruleTicks';
import { useWidthPx } from './useWidthPx';

interface RuledFrameProps {
  widthMm: number;
  heightMm: number;
  units: RuleUnits;
  /** What the drawing shows, in words. */
  label: string;
  /** SVG whose coordinates are millimetres of the thing itself, from its top left corner. */
  children: ReactNode;
  caption?: ReactNode;
  /** Tallest the drawing may become; a long thing is then drawn smaller, still to scale. */
  maxHeightPx?: number;
  className?: string;
}

const GUTTER_TOP_PX = 26;
const END_ROOM = { right: 3, bottom: 5 } as const;
/** Width of a figure of the rule's mono face at 12 px. */
const FIGURE_PX = 7.4;
const tickPx = [5, 9, 13] as const;

/** Draws a thing to scale, with a measuring rule along its top and left edge. */
export function RuledFrame(props: RuledFrameProps) {
  const {
    widthMm,
    heightMm,
    units,
    label,
    children,
    caption,
    maxHeightPx = 640,
    className,
  } = props;
  const [ref, availablePx] = useWidthPx<HTMLElement>(420);
  const gutterPx = 23 + FIGURE_PX * Math.max(2, ruleEnd(heightMm, units).length);
  const roomPx = Math.max(60, availablePx - gutterPx - END_ROOM.right);
  const pxPerMm = Math.min(
    roomPx / widthMm,
    (maxHeightPx - GUTTER_TOP_PX - END_ROOM.bottom) / heightMm,
  );
  const drawn = { width: widthMm * pxPerMm, height: heightMm * pxPerMm };
  const frame = {
    width: gutterPx + drawn.width + END_ROOM.right,
    height: GUTTER_TOP_PX + drawn.height + END_ROOM.bottom,
  };
  return (
    <figure ref={ref} className={classNames('w-full', className)}>
      <svg
        role="img"
        aria-label={label}
        viewBox={`0 0 ${frame.width} ${frame.height}`}
        className="block h-auto max-w-full"
        style={{ width: frame.width }}
      >
        <g className="fill-ink-2 stroke-ink-2 font-mono text-xs" aria-hidden>
          <text x={gutterPx - 18} y={GUTTER_TOP_PX - 8} textAnchor="end" stroke="none">
            {units === 'metric' ? 'cm' : 'in'}
          </text>
          <Rule along="top" {...{ units, pxPerMm, gutterPx }} lengthMm={widthMm} />
          <Rule along="left" {...{ units, pxPerMm, gutterPx }} lengthMm={heightMm} />
        </g>
        <svg
          x={gutterPx}
          y={GUTTER_TOP_PX}
          width={drawn.width}
          height={drawn.height}
          viewBox={`0 0 ${widthMm} ${heightMm}`}
          className="keeps-colour"
        >
          {children}
        </svg>
      </svg>
      {caption && (
        <figcaption className="mt-2" style={{ paddingInlineStart: gutterPx }}>
          {caption}
        </figcaption>
      )}
    </figure>
  );
}

interface RuleProps {
  along: 'top' | 'left';
  lengthMm: number;
  units: RuleUnits;
  pxPerMm: number;
  gutterPx: number;
}

function Rule({ along, lengthMm, units, pxPerMm, gutterPx }: RuleProps) {
  const onTop = along === 'top';
  const place = onTop ? placeOnTop : placeOnLeft;
  const end = ruleEnd(lengthMm, units);
  const endClearancePx = onTop ? FIGURE_PX * (end.length + 3) + 12 : 15;
  const ticks = ruleTicks(lengthMm, units, pxPerMm, endClearancePx);
  return (
    <>
      {ticks.map(({ atMm, rank, number }) => {
        const { line, text } = place(gutterPx, atMm * pxPerMm, tickPx[rank]);
        return (
          <Fragment key={atMm}>
            <line {...line} />
            {number !== undefined && (
              <text {...text} stroke="none">
                {number}
              </text>
            )}
          </Fragment>
        );
      })}
      <RuleEnd {...place(gutterPx, lengthMm * pxPerMm, tickPx[2])} backwards={onTop}>
        {end}
      </RuleEnd>
    </>
  );
}

interface Placed {
  line: { x1: number; y1: number; x2: number; y2: number };
  text: { x: number; y: number; textAnchor: 'start' | 'end' };
}

/** The last tick, which is the size itself; on top its figure stands before it, to stay in the frame. */
function RuleEnd({
  line,
  text,
  backwards,
  children,
}: Placed & { backwards: boolean; children: string }) {
  const before = backwards && { x: line.x1 - 4, textAnchor: 'end' as const };
  return (
    <g className="fill-ink stroke-ink font-bold">
      <line {...line} strokeWidth="2" />
      <text {...text} {...before} stroke="none">
        {children}
      </text>
    </g>
  );
}

/** On top a number stands to the right of its tick, on the left before it: never in the drawing. */
function placeOnTop(gutterPx: number, alongPx: number, tickLengthPx: number): Placed {
  const x = gutterPx + alongPx;
  const foot = GUTTER_TOP_PX - 3;
  return {
    line: { x1: x, x2: x, y1: foot - tickLengthPx, y2: foot },
    text: { x: x + 3, y: foot - 9, textAnchor: 'start' },
  };
}

function placeOnLeft(gutterPx: number, alongPx: number, tickLengthPx: number): Placed {
  const y = GUTTER_TOP_PX + alongPx;
  const foot = gutterPx - 3;
  return {
    line: { y1: y, y2: y, x1: foot - tickLengthPx, x2: foot },
    text: { x: foot - 16, y: y + 4, textAnchor: 'end' },
  };
}

import type { ReactNode } from 'react';
import { classNames } from './classNames';
import { ruleEnd, ruleTicks, type RuleTick, type RuleUnits } from './ruleTicks';
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

const GUTTER = { left: 38, top: 26 } as const;
const END_ROOM = { right: 8, bottom: 4 } as const;
const tickPx = [5, 9, 13] as const;

/** Draws a thing to scale, with a measuring rule along its top and left edge. */
export function RuledFrame(props: RuledFrameProps) {
  const { widthMm, heightMm, units, label, children, caption, maxHeightPx = 640, className } = props;
  const [ref, availablePx] = useWidthPx<HTMLElement>(420);
  const roomPx = Math.max(60, availablePx - GUTTER.left - END_ROOM.right);
  const pxPerMm = Math.min(roomPx / widthMm, (maxHeightPx - GUTTER.top - END_ROOM.bottom) / heightMm);
  const drawn = { width: widthMm * pxPerMm, height: heightMm * pxPerMm };
  const frame = {
    width: GUTTER.left + drawn.width + END_ROOM.right,
    height: GUTTER.top + drawn.height + END_ROOM.bottom,
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
        <g className="stroke-ink-2 fill-ink-2 font-mono text-xs" aria-hidden>
          <text x={GUTTER.left - 7} y={GUTTER.top - 7} textAnchor="end" stroke="none">
            {units === 'metric' ? 'cm' : 'in'}
          </text>
          <Rule along="top" {...{ units, pxPerMm }} lengthMm={widthMm} />
          <Rule along="left" {...{ units, pxPerMm }} lengthMm={heightMm} />
        </g>
        <svg
          x={GUTTER.left}
          y={GUTTER.top}
          width={drawn.width}
          height={drawn.height}
          viewBox={`0 0 ${widthMm} ${heightMm}`}
          className="keeps-colour"
        >
          {children}
        </svg>
      </svg>
      {caption && (
        <figcaption className="mt-2" style={{ paddingInlineStart: GUTTER.left }}>
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
}

function Rule({ along, lengthMm, units, pxPerMm }: RuleProps) {
  const place = along === 'top' ? placeOnTop : placeOnLeft;
  const ticks = ruleTicks(lengthMm, units, pxPerMm);
  const endPx = lengthMm * pxPerMm;
  return (
    <>
      {ticks.map((tick) => (
        <Tick key={tick.atMm} {...place(tick.atMm * pxPerMm, tickPx[tick.rank])} tick={tick} />
      ))}
      <g className="stroke-ink fill-ink font-bold" strokeWidth="2">
        <Tick {...place(endPx, tickPx[2])} tick={{ atMm: lengthMm, rank: 2 }}>
          {ruleEnd(lengthMm, units)}
        </Tick>
      </g>
    </>
  );
}

interface Placed {
  line: { x1: number; y1: number; x2: number; y2: number };
  text: { x: number; y: number; textAnchor: 'start' | 'end' };
}

/** Numbers stand to the left of their tick on top, and below it on the left: never in the drawing. */
function placeOnTop(alongPx: number, tickLengthPx: number): Placed {
  const x = GUTTER.left + alongPx;
  const foot = GUTTER.top - 3;
  return {
    line: { x1: x, x2: x, y1: foot - tickLengthPx, y2: foot },
    text: { x: x + 3, y: foot - 9, textAnchor: 'start' },
  };
}

function placeOnLeft(alongPx: number, tickLengthPx: number): Placed {
  const y = GUTTER.top + alongPx;
  const foot = GUTTER.left - 3;
  return {
    line: { y1: y, y2: y, x1: foot - tickLengthPx, x2: foot },
    text: { x: foot - 15, y: y + 4, textAnchor: 'end' },
  };
}

function Tick({ line, text, tick, children }: Placed & { tick: RuleTick; children?: ReactNode }) {
  return (
    <>
      <line {...line} />
      {(children ?? tick.number) !== undefined && (
        <text {...text} stroke="none">
          {children ?? tick.number}
        </text>
      )}
    </>
  );
}

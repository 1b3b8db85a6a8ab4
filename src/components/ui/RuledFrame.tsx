import type { ReactNode } from 'react';
import { classNames } from './classNames';
import { GUTTER_TOP_PX, gutterLeftPx, Rule } from './Rule';
import type { RuleUnits } from './ruleTicks';
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

const END_ROOM = { right: 3, bottom: 5 } as const;

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
  const gutterPx = gutterLeftPx(heightMm, units);
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

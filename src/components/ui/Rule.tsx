import { Fragment } from 'react';
import { ruleEnd, ruleTicks, type RuleUnits } from './ruleTicks';

export const GUTTER_TOP_PX = 26;
/** Width of a figure of the rule's mono face at 12 px. */
const FIGURE_PX = 7.4;
const tickPx = [5, 9, 13] as const;

/** Room beside the drawing for the ticks and the longest number of the left edge. */
export function gutterLeftPx(heightMm: number, units: RuleUnits): number {
  return 23 + FIGURE_PX * Math.max(2, ruleEnd(heightMm, units).length);
}

interface RuleProps {
  along: 'top' | 'left';
  lengthMm: number;
  units: RuleUnits;
  pxPerMm: number;
  gutterPx: number;
}

/** One edge of the rule. There is no line along it: the thing itself is the line. */
export function Rule({ along, lengthMm, units, pxPerMm, gutterPx }: RuleProps) {
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

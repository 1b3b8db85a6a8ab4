import { useRef, type KeyboardEvent, type ReactNode } from 'react';
import type { Chart } from '../../lib/chart/layoutChart';
import { GUTTER_TOP_PX, gutterLeftPx, Rule } from '../ui/Rule';
import type { RuleUnits } from '../ui/ruleTicks';
import { useWidthPx } from '../ui/useWidthPx';
import { usePointers, useWheel } from './usePointers';
import type { InSight, Zoom } from './useZoom';

interface ChartFrameProps {
  chart: Chart;
  zoom: Zoom;
  units: RuleUnits;
  /** What is drawn and what the keys do, for whoever cannot see it. */
  label: string;
  maxHeightPx: number;
  onHover: (atMm: readonly [number, number] | null) => void;
  onTap: (atMm: readonly [number, number]) => void;
  onKeyDown: (event: KeyboardEvent) => void;
  /** SVG in mm from the point the symbols are measured from. */
  children: ReactNode;
}

/** Room round the motif, so that what reaches over its edge is drawn whole. */
export const marginMmOf = ({ overMm, stitchWidthMm }: Chart): number =>
  overMm + 0.3 * stitchWidthMm;

/** A chart under the rule, which moves and grows with what is looked at. */
export function ChartFrame(props: ChartFrameProps) {
  const { chart, zoom, units, label, maxHeightPx, onHover, onTap, onKeyDown, children } = props;
  const { widthMm, heightMm, originMm } = chart;
  const marginMm = marginMmOf(chart);
  const [ref, availablePx] = useWidthPx<HTMLDivElement>(420);
  const gutterPx = gutterLeftPx(heightMm, units);
  const wholeMm = { width: widthMm + 2 * marginMm, height: heightMm + 2 * marginMm };
  const wholePxPerMm = Math.min(
    Math.max(60, availablePx - gutterPx - 1) / wholeMm.width,
    (maxHeightPx - GUTTER_TOP_PX) / wholeMm.height,
  );
  const { zoom: times, leftMm, topMm } = zoom.view;
  const pxPerMm = wholePxPerMm * times;
  const drawn = { width: wholeMm.width * wholePxPerMm, height: wholeMm.height * wholePxPerMm };
  const frame = useRef<SVGSVGElement>(null);

  function inSight(clientX: number, clientY: number): InSight {
    const box = frame.current?.getBoundingClientRect();
    const scale = box && box.width > 0 ? (gutterPx + drawn.width) / box.width : 1;
    return [
      ((clientX - (box?.left ?? 0)) * scale - gutterPx) / drawn.width,
      ((clientY - (box?.top ?? 0)) * scale - GUTTER_TOP_PX) / drawn.height,
    ];
  }
  const toMm = ([across, down]: InSight): readonly [number, number] => [
    leftMm + (across * wholeMm.width) / times,
    topMm + (down * wholeMm.height) / times,
  ];
  const pointers = usePointers({
    ...{ zoom, inSight },
    onHover: (at) => onHover(at && toMm(at)),
    onTap: (at) => onTap(toMm(at)),
  });
  useWheel(frame, zoom, inSight);

  return (
    <div ref={ref}>
      <svg
        ref={frame}
        role="group"
        aria-label={label}
        tabIndex={0}
        onKeyDown={onKeyDown}
        {...pointers}
        viewBox={`0 0 ${gutterPx + drawn.width} ${GUTTER_TOP_PX + drawn.height}`}
        className="block h-auto max-w-full select-none"
        style={{
          width: gutterPx + drawn.width,
          touchAction: times > 1 ? 'none' : 'pan-y',
          cursor: times > 1 ? 'grab' : undefined,
        }}
      >
        <g className="fill-ink-2 stroke-ink-2 font-mono text-xs" aria-hidden>
          <text x={gutterPx - 18} y={GUTTER_TOP_PX - 8} textAnchor="end" stroke="none">
            {units === 'metric' ? 'cm' : 'in'}
          </text>
          <svg x={gutterPx - 1} width={drawn.width + 1} height={GUTTER_TOP_PX}>
            <g transform={`translate(${(marginMm - leftMm) * pxPerMm - gutterPx + 1} 0)`}>
              <Rule along="top" {...{ units, pxPerMm, gutterPx }} lengthMm={widthMm} />
            </g>
          </svg>
          <svg y={GUTTER_TOP_PX - 1} width={gutterPx} height={drawn.height + 1}>
            <g transform={`translate(0 ${(marginMm - topMm) * pxPerMm - GUTTER_TOP_PX + 1})`}>
              <Rule along="left" {...{ units, pxPerMm, gutterPx }} lengthMm={heightMm} />
            </g>
          </svg>
        </g>
        <svg
          x={gutterPx}
          y={GUTTER_TOP_PX}
          width={drawn.width}
          height={drawn.height}
          viewBox={`${leftMm - marginMm - originMm[0]} ${topMm - marginMm - originMm[1]} ${wholeMm.width / times} ${wholeMm.height / times}`}
          className="keeps-colour"
          aria-hidden
        >
          {children}
        </svg>
      </svg>
    </div>
  );
}

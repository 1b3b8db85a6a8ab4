import { useId } from 'react';
import { HatchPattern } from '../../ui/StrandPattern';
import { axisFor, shareOf, type Axis } from './ranges';

export interface Range {
  label: string;
  low: number;
  high: number;
  /** Where an upright line stands. */
  mark?: number;
  /** What is usual is a plain band; what is not sure is hatched. */
  look: 'usual' | 'unsure';
}

interface RangesProps {
  rows: readonly Range[];
  /** The unit of the axis, "stitches in 10 cm". */
  unit: string;
  /** What the drawing shows, in words. */
  label: string;
}

const ROW_PX = 20;
const percent = (axis: Axis, value: number) => `${(100 * shareOf(axis, value)).toFixed(2)}%`;

/** Ranges over one axis: how wide each is, and where its middle lies. */
export function Ranges({ rows, unit, label }: RangesProps) {
  const axis = axisFor(rows.flatMap(({ low, high, mark }) => [low, high, mark ?? low]));
  return (
    <figure role="img" aria-label={label} className="text-sm text-ink-2">
      <div className="grid grid-cols-[auto_1fr] items-center gap-x-3" aria-hidden>
        {rows.map((row) => (
          <RangeRow key={row.label} row={row} axis={axis} />
        ))}
        <span className="self-start pt-1.5 text-xs">{unit}</span>
        <AxisLine axis={axis} />
      </div>
    </figure>
  );
}

function RangeRow({ row, axis }: { row: Range; axis: Axis }) {
  const id = useId();
  const { label, low, high, mark, look } = row;
  const x = percent(axis, low);
  const width = `${(100 * (shareOf(axis, high) - shareOf(axis, low))).toFixed(2)}%`;
  return (
    <>
      <span>{label}</span>
      <svg width="100%" height={ROW_PX} className="keeps-colour block overflow-visible">
        <HatchPattern id={id} />
        <rect
          {...{ x, width }}
          y="5"
          height={ROW_PX - 10}
          rx="1.5"
          {...(look === 'unsure'
            ? { fill: `url(#${id})`, className: 'stroke-amber-ink' }
            : { className: 'fill-teal-soft stroke-teal' })}
        />
        {mark !== undefined && (
          <line
            x1={percent(axis, mark)}
            x2={percent(axis, mark)}
            y1="1"
            y2={ROW_PX - 1}
            strokeWidth="2"
            className="stroke-ink"
          />
        )}
      </svg>
    </>
  );
}

function AxisLine({ axis }: { axis: Axis }) {
  return (
    <svg width="100%" height="24" className="figures block overflow-visible fill-ink-2 text-xs">
      {axis.ticks.map((tick) => {
        const x = percent(axis, tick);
        return (
          <g key={tick}>
            <line x1={x} x2={x} y1="0" y2="6" className="stroke-ink-2" />
            <text x={x} y="20" textAnchor="middle">
              {tick}
            </text>
          </g>
        );
      })}
    </svg>
  );
}

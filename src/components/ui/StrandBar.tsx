import { useId } from 'react';
import type { WeightCategory } from '../../lib/plan/plan';
import { classNames } from './classNames';
import { HatchPattern, StrandPattern } from './StrandPattern';

interface StrandBarProps {
  colour: string;
  weight: WeightCategory;
  /** Length of the bar, 0 to 1 of the track. */
  fraction: number;
  /** Where an upright line stands, 0 to 1: what one owns or will buy. */
  mark?: number;
  /** End of the amber hatch that begins where the bar ends, 0 to 1: what being sure takes. */
  sureFraction?: number;
  /** What the bar shows, in words and figures. */
  label: string;
  heightPx?: number;
  className?: string;
}

const percent = (fraction: number) => `${(100 * Math.min(1, Math.max(0, fraction))).toFixed(2)}%`;

export function StrandBar(props: StrandBarProps) {
  const { colour, weight, fraction, mark, sureFraction, label, heightPx = 14, className } = props;
  const id = useId();
  const top = 4;
  const bar = { y: top + 0.5, height: heightPx - 1 };
  return (
    <svg
      role="img"
      aria-label={label}
      width="100%"
      height={heightPx + 2 * top}
      className={classNames('keeps-colour block overflow-visible', className)}
    >
      <StrandPattern id={`${id}yarn`} colour={colour} weight={weight} />
      <HatchPattern id={`${id}hatch`} />
      <rect y={top} width="100%" height={heightPx} rx="2" className="fill-sunk" />
      {sureFraction !== undefined && sureFraction > fraction && (
        <rect
          {...bar}
          x={percent(fraction)}
          width={percent(sureFraction - fraction)}
          fill={`url(#${id}hatch)`}
          className="stroke-amber-ink"
        />
      )}
      {fraction > 0 && (
        <rect
          {...bar}
          width={percent(fraction)}
          rx="2"
          fill={`url(#${id}yarn)`}
          className="stroke-edge"
        />
      )}
      {mark !== undefined && (
        <line
          x1={percent(mark)}
          x2={percent(mark)}
          y1="0"
          y2={heightPx + 2 * top}
          strokeWidth="2"
          className="stroke-ink"
        />
      )}
    </svg>
  );
}

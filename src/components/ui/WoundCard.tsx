import { CARD, strandThickness, woundStrands } from './strands';
import type { WeightCategory } from '../../lib/plan/plan';
import { classNames } from './classNames';

interface WoundCardProps {
  /** sRGB "#rrggbb". */
  colour: string;
  weight: WeightCategory;
  size?: 'sm' | 'md' | 'lg';
  name?: string;
  lot?: string;
  /** As shown, with its unit: "640 m". */
  amount?: string;
  /** Says what the card is where no name stands beneath it; without either it is decoration. */
  label?: string;
  beside?: boolean;
  className?: string;
}

const heightPx = { sm: 36, md: 56, lg: 96 } as const;

/** A yarn colour: a card wound with it. */
export function WoundCard(props: WoundCardProps) {
  const { size = 'md', name, lot, amount, beside, className } = props;
  const words = name || lot || amount;
  if (!words) return <CardDrawing {...props} />;
  return (
    <div
      className={classNames(
        'inline-flex align-middle',
        beside ? 'items-center gap-3' : 'flex-col items-center gap-1 text-center',
        className,
      )}
    >
      <CardDrawing {...props} className="" />
      <div className={size === 'sm' && !beside ? 'text-xs' : 'text-sm'}>
        {name && <div className={classNames('font-bold', beside && 'text-base')}>{name}</div>}
        {lot && <div className="text-ink-2">lot {lot}</div>}
        {amount && <div className="figures text-ink-2">{amount}</div>}
      </div>
    </div>
  );
}

function CardDrawing({ colour, weight, size = 'md', name, label, className }: WoundCardProps) {
  const height = heightPx[size];
  const unitsPerPx = CARD.height / height;
  const thickness = strandThickness(weight);
  const strands = woundStrands(weight);
  const says = label && !name ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true };
  return (
    <svg
      {...says}
      width={(height * CARD.width) / CARD.height}
      height={height}
      viewBox={`0 0 ${CARD.width} ${CARD.height}`}
      fill="none"
      className={classNames('keeps-colour shrink-0', className)}
    >
      <rect
        x={CARD.edge}
        y={0.5 * unitsPerPx}
        width={CARD.width - 2 * CARD.edge}
        height={CARD.height - unitsPerPx}
        rx="2.5"
        className="fill-card stroke-card-edge"
        strokeWidth={unitsPerPx}
      />
      <g strokeLinecap="round">
        <path d={strands.middle} className="stroke-edge" strokeWidth={thickness + 2 * unitsPerPx} />
        <path d={strands.middle} stroke={colour} strokeWidth={thickness} />
        <path d={strands.shade} stroke="#000" strokeOpacity="0.3" strokeWidth={0.2 * thickness} />
        <path d={strands.light} stroke="#fff" strokeOpacity="0.4" strokeWidth={0.18 * thickness} />
      </g>
      {size !== 'sm' && (
        <path d={strands.plies} stroke="#000" strokeOpacity="0.17" strokeWidth={0.13 * thickness} />
      )}
    </svg>
  );
}

import { plyPitchPx } from './strands';
import type { WeightCategory } from '../../lib/plan/plan';

interface StrandPatternProps {
  id: string;
  colour: string;
  weight: WeightCategory;
}

/** Yarn seen side on, as a fill: its colour under fine slanting light and dark lines. Sizes are in px. */
export function StrandPattern({ id, colour, weight }: StrandPatternProps) {
  const pitch = plyPitchPx(weight);
  return (
    <pattern
      id={id}
      width={pitch}
      height={pitch}
      patternUnits="userSpaceOnUse"
      patternTransform="skewX(-22)"
    >
      <rect width={pitch} height={pitch} fill={colour} />
      <rect x={pitch - 2} width="1" height={pitch} fill="#fff" fillOpacity="0.35" />
      <rect x={pitch - 1} width="1" height={pitch} fill="#000" fillOpacity="0.32" />
    </pattern>
  );
}

/** The amber hatch that means "not sure". */
export function HatchPattern({ id }: { id: string }) {
  return (
    <pattern
      id={id}
      width="6"
      height="6"
      patternUnits="userSpaceOnUse"
      patternTransform="rotate(45)"
    >
      <rect width="6" height="6" className="fill-amber-soft" />
      <rect width="2.5" height="6" className="fill-amber" />
    </pattern>
  );
}

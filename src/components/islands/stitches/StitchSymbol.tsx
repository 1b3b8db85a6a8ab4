import { sampleSymbol } from '../../../lib/chart/sampleSymbol';
import { SIZES } from '../../../lib/chart/sizes';
import { symbolPath } from '../../../lib/chart/symbolPath';
import { ownStitchCode, type OwnStitch } from '../../../lib/stitches/ownStitch';
import { classNames } from '../../ui/classNames';

/** How a chart draws a stitch of one's own; the name beside it says what it is. */
export function StitchSymbol({ stitch, className }: { stitch: OwnStitch; className?: string }) {
  const sample = sampleSymbol(ownStitchCode(stitch), stitch);
  const { line, solid } = symbolPath(sample);
  const middle = Math.min(-0.45, sample.head[1] / 2);
  return (
    <svg
      viewBox={`-1 ${middle - 1.4} 2 2.8`}
      className={classNames('shrink-0 text-ink', className ?? 'h-10 w-7')}
      aria-hidden
    >
      <path
        d={line}
        fill="none"
        stroke="currentColor"
        strokeWidth={1.3 * SIZES.line}
        strokeLinecap="round"
      />
      <path d={solid} fill="currentColor" />
    </svg>
  );
}

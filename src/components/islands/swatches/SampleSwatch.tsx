import type { Units } from '../../../lib/units/display';
import { RuledFrame } from '../../ui/RuledFrame';
import { SwatchDrawing } from './SwatchDrawing';
import { PLAIN_YARN } from './swatchForm';

const SAMPLE = { stitch: 'sc', stitches: 20, rows: 18, widthMm: 150, heightMm: 124 } as const;

interface SampleSwatchProps {
  units: Units;
  className?: string;
}

/** A small swatch under the rule, where a page has none of one's own to show. */
export function SampleSwatch({ units, className = 'w-60' }: SampleSwatchProps) {
  return (
    <div className={className}>
      <RuledFrame
        widthMm={SAMPLE.widthMm}
        heightMm={SAMPLE.heightMm}
        units={units}
        label="A swatch of 20 stitches by 18 rows of single crochet, drawn to scale"
      >
        <SwatchDrawing {...SAMPLE} hex={PLAIN_YARN} />
      </RuledFrame>
    </div>
  );
}

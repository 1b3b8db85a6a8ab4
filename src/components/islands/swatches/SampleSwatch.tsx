import type { Units } from '../../../lib/units/display';
import { RuledFrame } from '../../ui/RuledFrame';
import { SwatchDrawing } from './SwatchDrawing';
import { PLAIN_YARN } from './swatchForm';

const SAMPLE = { stitch: 'sc', stitches: 20, rows: 18, widthMm: 150, heightMm: 124 } as const;

/** A small swatch under the rule, where a page has none of one's own to show. */
export function SampleSwatch({ units }: { units: Units }) {
  return (
    <div className="w-66">
      <RuledFrame
        widthMm={SAMPLE.widthMm}
        heightMm={SAMPLE.heightMm}
        units={units}
        maxHeightPx={200}
        label="A swatch of 20 stitches by 18 rows of single crochet, drawn to scale"
      >
        <SwatchDrawing {...SAMPLE} hex={PLAIN_YARN} />
      </RuledFrame>
    </div>
  );
}

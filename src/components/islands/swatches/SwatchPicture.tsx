import type { SwatchGauge } from '../../../lib/swatches/swatchGauge';
import { showSize, type Units } from '../../../lib/units/display';
import { codeWord, type Terms } from '../../planner/stitchWord';
import { RuledFrame } from '../../ui/RuledFrame';
import { SwatchDrawing } from './SwatchDrawing';

interface SwatchPictureProps {
  swatch: { stitch: string; stitches: number; rows: number };
  gauge: SwatchGauge;
  hex: string;
  units: Units;
  terms: Terms;
  maxHeightPx?: number;
}

/** The swatch to scale under the rule. */
export function SwatchPicture(props: SwatchPictureProps) {
  const { swatch, gauge, hex, units, terms, maxHeightPx = 380 } = props;
  const { widthMm, heightMm, blocked } = gauge;
  const size = showSize(widthMm, heightMm, units);
  const word = codeWord(swatch.stitch, terms);
  return (
    <RuledFrame
      widthMm={widthMm}
      heightMm={heightMm}
      units={units}
      maxHeightPx={maxHeightPx}
      label={`The swatch to scale: ${swatch.stitches} stitches by ${swatch.rows} rows of ${word}, ${size}.`}
      caption={
        <>
          <b>{size}</b>{' '}
          <span className="text-ink-2">
            {blocked ? 'blocked' : 'before blocking'}, {swatch.stitches} stitches by {swatch.rows}{' '}
            rows of {word}
          </span>
        </>
      }
    >
      <SwatchDrawing {...swatch} {...{ widthMm, heightMm, hex }} />
    </RuledFrame>
  );
}

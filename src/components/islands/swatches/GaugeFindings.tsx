import type { SwatchGauge } from '../../../lib/swatches/swatchGauge';
import type { SwatchYarn } from '../../../lib/swatches/swatchRecord';
import type { MeanInterval } from '../../../lib/stats/meanInterval';
import type { Units } from '../../../lib/units/display';
import { YARN_CATEGORIES } from '../../../lib/yarnCategories';
import { Fact } from '../../ui/Fact';
import { countInWords } from '../../ui/inWords';
import { Ranges, type Range } from './Ranges';
import { fineFigure, GAUGE_SPAN, perSpan, showFine } from './swatchWords';

interface GaugeFindingsProps {
  gauge: SwatchGauge;
  yarn: SwatchYarn | null;
  units: Units;
}

/** The gauge: how many to the span, how wide and how tall, how sure, and what is usual. */
export function GaugeFindings({ gauge, yarn, units }: GaugeFindingsProps) {
  const { stitchWidth, rowHeight } = gauge;
  const span = GAUGE_SPAN[units];
  return (
    <section aria-label="Gauge" className="grid content-start gap-4">
      <Fact
        lead={`In ${span.words}`}
        answer={
          <>
            {perSpan(stitchWidth.mean, units)}
            <span className="text-2xl tracking-normal"> stitches</span>{' '}
            <span className="whitespace-nowrap">
              {perSpan(rowHeight.mean, units)}
              <span className="text-2xl tracking-normal"> rows</span>
            </span>
          </>
        }
        live
      >
        A stitch is <Sized interval={stitchWidth} units={units} /> wide, a row{' '}
        <Sized interval={rowHeight} units={units} /> tall. {surenessWords(stitchWidth.count)}
      </Fact>
      <GaugeRanges {...{ gauge, yarn, units }} />
    </section>
  );
}

function Sized({ interval, units }: { interval: MeanInterval; units: Units }) {
  const { mean, plusMinus } = interval;
  return (
    <span className="whitespace-nowrap">
      <b className="text-ink">{showFine(mean, units)}</b>
      {plusMinus !== null && ` ± ${fineFigure(plusMinus, units)}`}
    </span>
  );
}

function surenessWords(count: number): string {
  return count === 1
    ? 'One measurement cannot say how sure that is: measure again, elsewhere on the swatch.'
    : `95\u00a0% sure, from ${countInWords(count)} measurements.`;
}

/** Stitches to the span: what the yarn's weight usually gives, and this swatch. */
function GaugeRanges({ gauge, yarn, units }: GaugeFindingsProps) {
  const span = GAUGE_SPAN[units];
  const { mean, plusMinus } = gauge.stitchWidth;
  const counted = span.mm / mean;
  const rows: Range[] = [
    {
      label: 'this swatch',
      low: span.mm / (mean + (plusMinus ?? 0)),
      high: span.mm / Math.max(mean - (plusMinus ?? 0), mean / 4),
      mark: counted,
      look: 'unsure',
    },
  ];
  if (!yarn || !gauge.usualWidthMm) {
    return (
      <p className="text-ink-2">
        Choose the yarn, and this says how the gauge stands beside what its weight usually gives.
      </p>
    );
  }
  const [narrowest, widest] = gauge.usualWidthMm;
  const name = YARN_CATEGORIES[yarn.weightCategory]?.name.toLowerCase() ?? '';
  const usual = [span.mm / widest, span.mm / narrowest] as const;
  rows.unshift({
    label: `usual for ${name}`,
    low: usual[0],
    high: usual[1],
    look: 'usual',
  });
  return (
    <Ranges
      rows={rows}
      unit={`stitches in ${span.words}`}
      label={`${counted.toFixed(1)} stitches in ${span.words}; usual for ${name} yarn are ${usual[0].toFixed(1)} to ${usual[1].toFixed(1)}.`}
    />
  );
}

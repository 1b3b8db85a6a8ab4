import type { ReactNode } from 'react';
import type { SwatchGauge } from '../../../lib/swatches/swatchGauge';
import { swatchGauge } from '../../../lib/swatches/swatchGauge';
import type { SwatchRecord } from '../../../lib/swatches/swatchRecord';
import { swatchYarn, type SwatchYarnFindings } from '../../../lib/swatches/swatchYarn';
import { showYarn, type Units } from '../../../lib/units/display';
import { YARN_CATEGORIES } from '../../../lib/yarnCategories';
import { codeWord, type Terms } from '../../planner/stitchWord';
import { Notice } from '../../ui/Notice';
import { GaugeFindings } from './GaugeFindings';
import { SwatchPicture } from './SwatchPicture';
import { GAUGE_SPAN, perSpan } from './swatchWords';
import { YarnFindings } from './YarnFindings';

export interface Findings {
  swatch: SwatchRecord;
  gauge: SwatchGauge;
  yarn: SwatchYarnFindings | null;
}

export function findingsOf(swatch: SwatchRecord | null): Findings | null {
  const gauge = swatch && swatchGauge(swatch);
  return swatch && gauge && { swatch, gauge, yarn: swatchYarn(swatch, gauge.stitchWidth.mean) };
}

interface SwatchFindingsProps {
  findings: Findings;
  hex: string;
  units: Units;
  terms: Terms;
  /** What to do with it, under the picture. */
  children?: ReactNode;
}

/** What the swatch says: drawn to scale, as a gauge, and as yarn per loop. */
export function SwatchFindings(props: SwatchFindingsProps) {
  const { findings, hex, units, terms, children } = props;
  const { swatch, gauge, yarn } = findings;
  return (
    <div className="grid gap-8 xl:grid-cols-[minmax(0,1fr)_minmax(20rem,1fr)]">
      <div className="grid content-start justify-items-start gap-6">
        <SwatchPicture {...{ swatch, gauge, hex, units, terms }} />
        {children}
      </div>
      <div className="grid content-start gap-8">
        <GaugeFindings {...{ gauge, units }} yarn={swatch.yarn} />
        {yarn ? (
          <YarnFindings {...{ yarn, units, terms }} stitch={swatch.stitch} />
        ) : (
          <WeighIt swatch={swatch} />
        )}
        <Questions {...{ findings, units, terms }} />
      </div>
    </div>
  );
}

/** The next thing worth doing, while the yarn in the swatch is not known. */
function WeighIt({ swatch }: { swatch: SwatchRecord }) {
  const isWeighed = swatch.measurements.some(({ kind }) => kind === 'weight');
  return (
    <Notice title={isWeighed ? 'A weight needs its yarn' : 'Weigh it'}>
      {isWeighed
        ? 'Grams become metres by the skein: choose the yarn from your stash, and the weight tells how much yarn you pull into a loop.'
        : 'Hands differ by a fifth and more in the yarn they pull into a loop. A weight on a kitchen scale, or the swatch unravelled and measured, tells yours.'}
    </Notice>
  );
}

function Questions({ findings, units, terms }: Omit<SwatchFindingsProps, 'hex' | 'children'>) {
  const { swatch, gauge, yarn } = findings;
  const word = codeWord(swatch.stitch, terms);
  const width = gauge.questions.includes('width');
  const proportion = gauge.questions.includes('proportion');
  return (
    <>
      {width && swatch.yarn && (
        <Notice kind="question" title="Is this gauge right?" live>
          {perSpan(gauge.stitchWidth.mean, units)} stitches in {GAUGE_SPAN[units].words} is unusual
          for weight {swatch.yarn.weightCategory}{' '}
          {YARN_CATEGORIES[swatch.yarn.weightCategory]?.name.toLowerCase()}. Check the stitches
          counted, the width, and the yarn’s weight. If they are right, keep them: the plan follows
          your hands.
        </Notice>
      )}
      {proportion && (
        <Notice kind="question" title="Are the rows right?" live>
          Each row stands {ratio(gauge.rowHeight.mean / gauge.stitchWidth.mean)} stitch widths tall;
          rows of {word} are usually near {ratio(gauge.usualHeightOverWidth)}. Check the rows
          counted, the height, and the stitch.
        </Notice>
      )}
      {yarn?.questioned && (
        <Notice kind="question" title="Is this weight right?" live>
          Such a swatch usually takes about {showYarn(yarn.usualM, units)}; this one took{' '}
          {showYarn(yarn.lengthM, units)}. Check the weight, the counts, and the skein’s metres.
        </Notice>
      )}
    </>
  );
}

const ratio = (value: number): string => value.toFixed(2);

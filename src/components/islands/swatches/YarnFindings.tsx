import type { LoopBelief, SwatchYarnFindings } from '../../../lib/swatches/swatchYarn';
import { MM_PER_INCH } from '../../../lib/units/conversion';
import { showYarn, type Units } from '../../../lib/units/display';
import { codeWord, type Terms } from '../../planner/stitchWord';
import { Ranges, type Range } from './Ranges';
import { showLoop } from './swatchWords';

interface YarnFindingsProps {
  yarn: SwatchYarnFindings;
  stitch: string;
  units: Units;
  terms: Terms;
}

/** Two-sided 95 %: the standard normal quantile of 0.975. */
const Z95 = 1.96;

/** What weighing taught: yarn per loop, before and after, drawn and said. */
export function YarnFindings({ yarn, stitch, units, terms }: YarnFindingsProps) {
  const { before, after, loopsPerStitch, loops } = yarn;
  const word = codeWord(stitch, terms);
  const shown = units === 'metric' ? 1 : MM_PER_INCH;
  return (
    <section aria-label="Yarn per loop" className="grid content-start gap-3">
      <div>
        <p className="text-ink-2">Yarn in a loop</p>
        <p className="text-2xl font-bold tabular-nums">
          {showLoop(after.meanMm, units)}{' '}
          <span className="text-base font-normal text-ink-2">
            ± {showLoop(Z95 * after.sdMm, units)}, 95&nbsp;% sure
          </span>
        </p>
      </div>
      <Ranges
        rows={[
          rangeOf('from its width alone', before, shown),
          rangeOf('from its yarn', after, shown),
        ]}
        unit={units === 'metric' ? 'mm in a loop' : 'inches in a loop'}
        label={`From its width alone ${showLoop(before.meanMm, units)} give or take ${showLoop(Z95 * before.sdMm, units)}; from its yarn ${showLoop(after.meanMm, units)} give or take ${showLoop(Z95 * after.sdMm, units)}.`}
      />
      <p className="text-ink-2">
        The swatch took <b className="text-ink">{showYarn(yarn.lengthM, units)}</b> for{' '}
        {loops.toLocaleString('en')} loops, chains and two tails included. One {word} lays{' '}
        {loopsPerStitch} {loopsPerStitch === 1 ? 'loop' : 'loops'}:{' '}
        {showLoop(loopsPerStitch * after.meanMm, units)} of yarn.{' '}
        <a className="link font-normal" href="/how-it-works#loops">
          How this is worked out
        </a>
      </p>
    </section>
  );
}

function rangeOf(label: string, { meanMm, sdMm }: LoopBelief, shown: number): Range {
  return {
    label,
    low: Math.max(0, meanMm - Z95 * sdMm) / shown,
    high: (meanMm + Z95 * sdMm) / shown,
    mark: meanMm / shown,
    look: 'unsure',
  };
}

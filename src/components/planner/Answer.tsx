import { CONFIDENCES, type Confidence, type Plan } from '../../lib/plan/plan';
import type { Estimate } from '../../lib/ledger/ledger';
import { showDuration, showPrice, showYarn, type Units } from '../../lib/units/display';
import { Fact } from '../ui/Fact';
import { countInWords } from '../ui/inWords';
import { SegmentedControl } from '../ui/SegmentedControl';
import type { ChangePlan } from './usePlan';

interface AnswerProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  change: ChangePlan;
}

export const skeinWord = (skeins: number): string =>
  `${skeins} ${skeins === 1 ? 'skein' : 'skeins'}`;
export const sureWord = (confidence: Confidence): string => `${100 * confidence}\u00a0%`;

/** The answer: how many skeins, how sure, and the sums behind it. */
export function Answer({ plan, estimate, units, change }: AnswerProps) {
  const { totals } = estimate;
  const used = estimate.colours.filter(({ skeins }) => skeins > 0).length;
  const inHandM = totals.skeins * plan.yarn.putUp.lengthM;
  const cost =
    plan.yarn.price &&
    totals.costMinor !== null &&
    showPrice(totals.costMinor, plan.yarn.price.currency);
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-4">
      <Fact
        lead="Buy or set aside"
        answer={skeinWord(totals.skeins)}
        live
        className="min-w-64 flex-1"
      >
        in {countInWords(used)} {used === 1 ? 'colour' : 'colours'},{' '}
        <b className="text-ink">{sureWord(plan.confidence)} sure</b> of each to finish.{' '}
        {showYarn(totals.meanM, units)} expected, {showYarn(inHandM, units)} in hand
        {cost && <>, {cost}</>}. About {showDuration(totals.durationS)} at the hook and needle.
      </Fact>
      <SegmentedControl
        label="How sure to be"
        figures
        value={String(plan.confidence)}
        onChange={(value) => change((old) => ({ ...old, confidence: Number(value) as Confidence }))}
        options={CONFIDENCES.map((confidence) => ({
          value: String(confidence),
          word: sureWord(confidence),
        }))}
      />
    </div>
  );
}

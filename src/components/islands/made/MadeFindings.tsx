import type { MotifSides } from '../../../lib/motifs/motif';
import { showFabric, showYarn, type Units } from '../../../lib/units/display';
import { acrossWord } from '../../motifs/motifWords';
import { Fact } from '../../ui/Fact';
import { Notice } from '../../ui/Notice';
import type { MadeFigures } from './madeFigures';
import { computedWords, sizeGiveOrTake, verdictChange } from './madeWords';
import { SizeChart } from './SizeChart';
import { SizeTable } from './SizeTable';
import { YarnTold } from './YarnTold';

interface MadeFindingsProps {
  figures: MadeFigures;
  sides: MotifSides;
  gaugeName: string;
  units: Units;
}

/** What was measured says: its size, its rounds to scale, how it lies, and its yarn. */
export function MadeFindings({ figures, sides, gaugeName, units }: MadeFindingsProps) {
  const { computed, measured } = figures;
  const verdict = verdictChange(figures);
  const shown = measured ?? computed;
  return (
    <div className="grid content-start gap-5">
      <Fact
        lead={measured ? 'Measured, it comes out' : 'By its rounds alone it comes out'}
        answer={showFabric(shown.acrossMm, units)}
        live
      >
        {acrossWord(sides)}, give or take {sizeGiveOrTake(shown.acrossSdMm, units)}
        {measured && `; ${computedWords(figures, units)}`} (95&nbsp;% sure), at the gauge of{' '}
        {gaugeName}.{' '}
        <a className="link font-normal" href="/how-it-works#size">
          How this is worked out
        </a>
      </Fact>
      <Questions {...{ figures, units }} />
      {verdict && (
        <Notice kind={measured?.trouble ? 'question' : 'note'} title="How it lies" live>
          {verdict}
        </Notice>
      )}
      <SizeChart {...{ figures, sides, units }} />
      <SizeTable {...{ figures, sides, units }} />
      <YarnTold {...{ figures, units }} />
    </div>
  );
}

function Questions({ figures, units }: Pick<MadeFindingsProps, 'figures' | 'units'>) {
  const odd = figures.measured?.rounds.filter(({ questioned }) => questioned) ?? [];
  const { yarn } = figures;
  return (
    <>
      {odd.length > 0 && (
        <Notice kind="question" title="Is this size right?" live>
          After {odd.map(({ label }) => label).join(', ')} it is further from the gauge than hands
          differ. Check the tape, the rounds counted, and the gauge.
        </Notice>
      )}
      {yarn?.questioned && (
        <Notice kind="question" title="Is this weight right?" live>
          Such a motif usually takes about {showYarn(yarn.before.meanM, units)}; each of these took{' '}
          {showYarn(yarn.readM, units)}. Check the weight, how many were on the scale, and the
          skein’s metres.
        </Notice>
      )}
    </>
  );
}

import { FLAT_FULLNESS } from '../../../lib/motifs/geometry';
import type { MeasuredRound } from '../../../lib/motifs/measuredMotif';
import type { MotifSides } from '../../../lib/motifs/motif';
import { showFabric, showMass, showYarn, type Units } from '../../../lib/units/display';
import { acrossWord } from '../../motifs/motifWords';
import { Fact } from '../../ui/Fact';
import { Notice } from '../../ui/Notice';
import type { MadeFigures } from './madeFigures';
import {
  computedWords,
  fineGiveOrTake,
  fineSize,
  sizeGiveOrTake,
  verdictChange,
  yarnGiveOrTake,
} from './madeWords';
import { SizeChart } from './SizeChart';

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

const NOTHING = <span className="text-ink-2">–</span>;

/** Every round before and after: the chart in figures. */
function SizeTable({ figures, sides, units }: Omit<MadeFindingsProps, 'gaugeName'>) {
  const { computed, measured } = figures;
  const head = 'px-2 py-1 text-end font-normal';
  const figure = 'figures px-2 py-1.5 text-end whitespace-nowrap';
  return (
    <div role="region" aria-label="Sizes by round" tabIndex={0} className="overflow-x-auto">
      <table className="w-full">
        <caption className="text-start text-sm text-ink-2">
          Size {acrossWord(sides)} after each round, in {units === 'metric' ? 'cm' : 'inches'}
        </caption>
        <thead>
          <tr className="align-bottom text-sm text-ink-2">
            <th scope="col" className="py-1 pe-2 text-start font-normal">
              After
            </th>
            <th scope="col" className={head}>
              by the gauge
            </th>
            <th scope="col" className={head}>
              the tape
            </th>
            <th scope="col" className={head}>
              comes out
            </th>
            <th scope="col" className={`${head} pe-0`}>
              fullness
            </th>
          </tr>
        </thead>
        <tbody>
          {computed.rounds.map((before, i) => {
            const measuredRound = measured?.rounds[i];
            const after = measuredRound ?? before;
            return (
              <tr key={i} className="border-t border-line">
                <th scope="row" className="py-1.5 pe-2 text-start font-bold whitespace-nowrap">
                  {before.label}
                </th>
                <td className={`${figure} text-ink-2`}>{fineSize(before.acrossMm, units)}</td>
                <td className={figure}>
                  {after.measuredMm === null ? NOTHING : fineSize(after.measuredMm, units)}
                </td>
                <td className={figure}>
                  {measuredRound ? (
                    <>
                      {fineSize(measuredRound.acrossMm, units)}{' '}
                      <span className="text-ink-2">
                        ± {fineGiveOrTake(measuredRound.acrossSdMm, units)}
                      </span>
                    </>
                  ) : (
                    NOTHING
                  )}
                </td>
                <td className={`${figure} pe-0`}>
                  <Fullness {...{ before, after }} isEarly={i < 2} />
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

/** The first rounds are small enough to be pulled flat, whatever their counts. */
function Fullness(props: { before: MeasuredRound; after: MeasuredRound; isEarly: boolean }) {
  const { before, after, isEarly } = props;
  const figure = after.fullness.toFixed(2);
  if (isEarly) return figure;
  const word = lies(after);
  return (
    <>
      {figure}{' '}
      <span className={`text-sm max-sm:block ${word === 'flat' ? 'text-ink-2' : 'text-amber-ink'}`}>
        {word}
        {word !== lies(before) && <span className="sr-only">, {lies(before)} by the gauge</span>}
      </span>
    </>
  );
}

function lies({ fullness }: MeasuredRound): string {
  const [least, most] = FLAT_FULLNESS;
  return fullness < least ? 'cups' : fullness > most ? 'ruffles' : 'flat';
}

/** Metres and grams of one motif, before and after it was weighed. */
function YarnTold({ figures, units }: Pick<MadeFindingsProps, 'figures' | 'units'>) {
  const { yarn } = figures;
  if (!yarn) {
    return (
      <p className="text-ink-2">
        Weigh it, and say how much a skein holds: this then says how much yarn one takes in your
        hand.
      </p>
    );
  }
  const { before, after, gramsPerM } = yarn;
  const mass = (lengthM: number) => showMass(lengthM * gramsPerM, 'metric');
  return (
    <div>
      <p className="text-ink-2">Yarn in each</p>
      <p className="text-2xl font-bold tabular-nums">
        {showYarn(after.meanM, units)}{' '}
        <span className="text-base font-normal text-ink-2">
          {mass(after.meanM)}, give or take {yarnGiveOrTake(after.sdM, units)}
        </span>
      </p>
      <p className="text-ink-2 tabular-nums">
        By the gauge alone {showYarn(before.meanM, units)}, {mass(before.meanM)}, give or take{' '}
        {yarnGiveOrTake(before.sdM, units)}; the scale alone says {showYarn(yarn.readM, units)}.{' '}
        <a className="link font-normal" href="/how-it-works#hand">
          How this is worked out
        </a>
      </p>
    </div>
  );
}

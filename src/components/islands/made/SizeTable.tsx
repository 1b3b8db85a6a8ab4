import { FLAT_FULLNESS } from '../../../lib/motifs/geometry';
import type { MeasuredRound } from '../../../lib/motifs/measuredMotif';
import type { MotifSides } from '../../../lib/motifs/motif';
import type { Units } from '../../../lib/units/display';
import { acrossWord } from '../../motifs/motifWords';
import type { MadeFigures } from './madeFigures';
import { fineGiveOrTake, fineSize } from './madeWords';

interface SizeTableProps {
  figures: MadeFigures;
  sides: MotifSides;
  units: Units;
}

const NOTHING = <span className="text-ink-2">–</span>;

/** Every round before and after: the chart in figures. */
export function SizeTable({ figures, sides, units }: SizeTableProps) {
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

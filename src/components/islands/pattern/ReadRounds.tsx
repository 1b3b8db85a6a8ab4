import { memo } from 'react';
import type { Gauge } from '../../../lib/gauge/gauge';
import type { MotifGeometry } from '../../../lib/motifs/geometry';
import type { Reading, WorkedRound } from '../../../lib/pattern/reading';
import { showFabric, showYarn, type Units } from '../../../lib/units/display';
import { acrossWord, countsInWords, spacesInWords } from '../../motifs/motifWords';
import type { Terms } from '../../planner/stitchWord';
import { classNames } from '../../ui/classNames';
import { showFine } from '../swatches/swatchWords';
import { patternYarn } from './patternYarn';
import { Claim, Fullness, perSideInWords } from './roundCells';

interface ReadRoundsProps {
  reading: Reading;
  geometry: MotifGeometry;
  gauge: Gauge;
  units: Units;
  terms: Terms;
  /** Lights a round in text and chart, by its place in the pattern. */
  onRound: (round: number | null) => void;
  /** Shows where the text says it. */
  onGo: (round: WorkedRound) => void;
}

/** Every round as worked: what is made and counted, what the note claims, size, fullness and yarn. */
export const ReadRounds = memo((props: ReadRoundsProps) => {
  const { reading, geometry, gauge, units, terms, onRound, onGo } = props;
  const { rounds, sides } = reading;
  const { rounds: yarn, byColour } = patternYarn(reading, gauge);
  const isFlat = rounds[0]?.kind === 'row';
  const total = yarn.reduce(
    (sum, { loops, lengthM }) => ({ loops: sum.loops + loops, lengthM: sum.lengthM + lengthM }),
    { loops: 0, lengthM: 0 },
  );
  const start = 'px-3 py-1 text-start font-normal';
  const end = 'px-3 py-1 text-end font-normal';
  const figure = 'figures px-3 py-2 text-end whitespace-nowrap';
  return (
    <div role="region" aria-label="Table of rounds" tabIndex={0} className="overflow-x-auto">
      <table className="w-full min-w-240">
        <thead>
          <tr className="align-bottom text-sm text-ink-2">
            <th
              scope="col"
              className={classNames(start, 'sticky start-0 bg-ground ps-0 print:static')}
            >
              {isFlat ? 'Row' : 'Round'}
            </th>
            <th scope="col" className={start}>
              The hook makes
            </th>
            <th scope="col" className={start}>
              counted as
            </th>
            <th scope="col" className={start}>
              the text says
            </th>
            <th scope="col" className={start}>
              spaces
            </th>
            <th scope="col" className={end}>
              {sides === 0 || isFlat ? 'in all' : 'to a side'}
            </th>
            <th scope="col" className={end}>
              {isFlat ? 'tall' : 'round tall'}
            </th>
            {!isFlat && (
              <th scope="col" className={end}>
                {acrossWord(sides)}
              </th>
            )}
            {!isFlat && (
              <th scope="col" className={end}>
                fullness
              </th>
            )}
            <th scope="col" className={end}>
              loops
            </th>
            <th scope="col" className={classNames(end, 'pe-0')}>
              yarn
            </th>
          </tr>
        </thead>
        <tbody>
          {rounds.map((round, i) => {
            const size = geometry.rounds[i];
            return (
              <tr
                key={i}
                className="group border-t border-line focus-within:bg-sunk hover:bg-sunk"
                onPointerEnter={() => onRound(i)}
                onPointerLeave={() => onRound(null)}
                onFocus={() => onRound(i)}
                onBlur={() => onRound(null)}
              >
                <th
                  scope="row"
                  className="sticky start-0 bg-ground py-2 pe-3 text-start whitespace-nowrap group-focus-within:bg-sunk group-hover:bg-sunk print:static"
                >
                  <button
                    type="button"
                    className="min-h-6 font-bold underline-offset-3 hover:underline coarse:min-h-11"
                    onClick={() => onGo(round)}
                  >
                    {round.label}
                  </button>
                  {round.colours.length > 0 && (
                    <span className="block text-sm font-normal text-ink-2">
                      {round.colours.join(', ')}
                    </span>
                  )}
                </th>
                <td className="px-3 py-2">{countsInWords(round.made, terms)}</td>
                <td className="px-3 py-2">{countsInWords(round.tally, terms)}</td>
                <td className="px-3 py-2">
                  <Claim {...{ round, reading, terms }} />
                </td>
                <td className="px-3 py-2 text-ink-2">{spacesInWords(round.spaces)}</td>
                <td className={figure}>{perSideInWords(round)}</td>
                <td className={figure}>{size && showFine(size.heightMm, units)}</td>
                {!isFlat && <td className={figure}>{size && showFabric(size.acrossMm, units)}</td>}
                {!isFlat && (
                  <td className={figure}>
                    {size?.fullness.toFixed(2)}
                    <Fullness {...{ round, geometry }} fullness={size?.fullness} isEarly={i < 2} />
                  </td>
                )}
                <td className={figure}>
                  {yarn[i]?.loops}
                  {yarn[i]?.byColour.map(({ colour, taken }) => (
                    <span key={colour} className="block text-sm text-ink-2">
                      {taken.loops}
                    </span>
                  ))}
                </td>
                <td className={classNames(figure, 'pe-0')}>
                  {showYarn(yarn[i]?.lengthM ?? 0, units)}
                  {yarn[i]?.byColour.map(({ colour, taken }) => (
                    <span key={colour} className="block text-sm text-ink-2">
                      {colour} {showYarn(taken.lengthM, units)}
                    </span>
                  ))}
                </td>
              </tr>
            );
          })}
        </tbody>
        <tfoot>
          {byColour.map(({ colour, taken }, i) => (
            <tr key={colour} className={i === 0 ? 'border-t border-edge' : 'border-t border-line'}>
              <th scope="row" colSpan={isFlat ? 7 : 9} className="py-2 pe-3 text-start">
                In {colour}
              </th>
              <td className={figure}>{taken.loops}</td>
              <td className={classNames(figure, 'pe-0')}>{showYarn(taken.lengthM, units)}</td>
            </tr>
          ))}
          <tr className="border-t border-edge font-bold">
            <th scope="row" colSpan={isFlat ? 7 : 9} className="py-2 pe-3 text-start">
              All {isFlat ? 'rows' : 'rounds'}
            </th>
            <td className={figure}>{total.loops}</td>
            <td className={classNames(figure, 'pe-0')}>{showYarn(total.lengthM, units)}</td>
          </tr>
        </tfoot>
      </table>
    </div>
  );
});
ReadRounds.displayName = 'ReadRounds';

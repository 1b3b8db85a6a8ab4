import type { MotifGeometry } from '../../../lib/motifs/geometry';
import type { Motif } from '../../../lib/motifs/motif';
import { showFabric, type Units } from '../../../lib/units/display';
import { acrossWord, countsInWords, spacesInWords } from '../../motifs/motifWords';
import type { Terms } from '../../planner/stitchWord';
import { showFine } from '../swatches/swatchWords';

interface RoundsTableProps {
  motif: Motif;
  geometry: MotifGeometry;
  units: Units;
  terms: Terms;
}

/** Every round: what the hook makes, what counts, and what that comes to. */
export function RoundsTable({ motif, geometry, units, terms }: RoundsTableProps) {
  const head = 'px-3 py-1 font-normal';
  return (
    <section aria-labelledby="rounds" className="mt-12">
      <h2 id="rounds">Rounds</h2>
      <p className="mt-1 text-ink-2">
        {motif.ring.chains === 0
          ? 'Worked into a magic ring.'
          : `Worked into a ring of ${countsInWords(motif.ring.made, terms)}.`}{' '}
        What the hook makes includes the chains that stand for a stitch and the slip stitches on the
        way.
      </p>
      <div role="region" aria-label="Table of rounds" tabIndex={0} className="mt-3 overflow-x-auto">
        <table className="w-full min-w-200">
          <thead>
            <tr className="text-sm text-ink-2">
              <th scope="col" className={`${head} ps-0 text-start`}>
                Round
              </th>
              <th scope="col" className={`${head} text-start`}>
                The hook makes
              </th>
              <th scope="col" className={`${head} text-start`}>
                counted as
              </th>
              <th scope="col" className={`${head} text-start`}>
                spaces
              </th>
              <th scope="col" className={`${head} text-end`}>
                {motif.sides === 0 ? 'all round' : 'to a side'}
              </th>
              <th scope="col" className={`${head} text-end`}>
                tall
              </th>
              <th scope="col" className={`${head} text-end`}>
                {acrossWord(motif.sides)}
              </th>
              <th scope="col" className={`${head} pe-0 text-end`}>
                fullness
              </th>
            </tr>
          </thead>
          <tbody>
            {motif.rounds.map((round, i) => {
              const size = geometry.rounds[i];
              return (
                <tr key={round.label} className="border-t border-line">
                  <th scope="row" className="py-2 pe-3 text-start whitespace-nowrap">
                    {round.label}
                  </th>
                  <td className="px-3 py-2">{countsInWords(round.made, terms)}</td>
                  <td className="px-3 py-2">{countsInWords(round.tally, terms)}</td>
                  <td className="px-3 py-2 text-ink-2">{spacesInWords(round.spaces)}</td>
                  <td className="figures px-3 py-2 text-end">{round.perSide}</td>
                  <td className="figures px-3 py-2 text-end whitespace-nowrap">
                    {size && showFine(size.heightMm, units)}
                  </td>
                  <td className="figures px-3 py-2 text-end whitespace-nowrap">
                    {size && showFabric(size.acrossMm, units)}
                  </td>
                  <td className="figures py-2 ps-3 text-end">{size?.fullness.toFixed(2)}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
      <p className="mt-2 text-sm text-ink-2">
        Fullness is the side as its stitches make it over the side as its rounds make it: under 0.92
        a motif cups, over 1.08 it ruffles. The first two rounds are small enough to be pulled flat.
      </p>
    </section>
  );
}

import { stitchRuns } from '../../lib/chart/stitchRuns';
import type { Reading } from '../../lib/pattern/reading';
import { codeWord, type Terms } from '../planner/stitchWord';
import { runInto, runRole, sideWords } from './chartWords';

/** What the chart shows, as tables: each round in the order of making. */
export function ChartTable({ reading, terms }: { reading: Reading; terms: Terms }) {
  return (
    <div className="grid gap-6">
      {reading.rounds.map((round, i) => {
        const below = reading.rounds[i - 1]?.places ?? reading.ring.places;
        const hasSides = round.corner !== null && reading.sides !== 0;
        return (
          <table key={i} className="w-full max-w-3xl">
            <caption className="pb-1 text-start font-bold">{round.label}</caption>
            <thead>
              <tr className="text-sm text-ink-2">
                {['Stitches', 'worked into', hasSides ? 'side' : '', 'what for'].map((word, j) =>
                  word || j === 2 ? (
                    <th key={j} scope="col" className="py-1 pe-3 text-start font-normal">
                      {word || <span className="sr-only">side</span>}
                    </th>
                  ) : null,
                )}
              </tr>
            </thead>
            <tbody>
              {stitchRuns(round, below).map((run) => (
                <tr key={run.first} className="border-t border-line">
                  <th
                    scope="row"
                    className="figures py-1 pe-3 text-start font-normal whitespace-nowrap"
                  >
                    {run.count} {codeWord(run.code, terms)}
                  </th>
                  <td className="py-1 pe-3">{runInto(run, terms)}</td>
                  <td className="py-1 pe-3 whitespace-nowrap">{sideWords(run, hasSides)}</td>
                  <td className="py-1 text-ink-2">{runRole(run)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        );
      })}
    </div>
  );
}

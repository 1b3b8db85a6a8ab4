import { memo } from 'react';
import { stitchRuns } from '../../lib/chart/stitchRuns';
import type { Place, Reading, WorkedRound } from '../../lib/pattern/reading';
import { codeWord, type Terms } from '../planner/stitchWord';
import { runInto, runRole, sideWords } from './chartWords';

/** What the chart shows, as tables: each round in the order of making. */
export const ChartTable = memo(({ reading, terms }: { reading: Reading; terms: Terms }) => (
  <div className="grid gap-6">
    {reading.rounds.map((round, i) => (
      <RoundTable
        key={i}
        {...{ round, terms }}
        below={reading.rounds[i - 1]?.places ?? reading.ring.places}
        hasSides={round.corner !== null && reading.sides !== 0}
      />
    ))}
  </div>
));
ChartTable.displayName = 'ChartTable';

interface RoundTableProps {
  round: WorkedRound;
  below: readonly Place[];
  terms: Terms;
  hasSides: boolean;
}

function RoundTable({ round, below, terms, hasSides }: RoundTableProps) {
  const columns = ['Stitches', 'worked into', hasSides ? 'side' : '', 'what for'];
  return (
    <table className="w-full max-w-3xl">
      <caption className="pb-1 text-start font-bold">{round.label}</caption>
      <thead>
        <tr className="text-sm text-ink-2">
          {columns.map((word, j) => (
            <th key={j} scope="col" className="py-1 pe-3 text-start font-normal">
              {word || <span className="sr-only">side</span>}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {stitchRuns(round, below).map((run) => (
          <tr key={run.first} className="border-t border-line">
            <th scope="row" className="figures py-1 pe-3 text-start font-normal whitespace-nowrap">
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
}

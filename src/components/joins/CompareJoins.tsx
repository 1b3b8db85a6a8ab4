import type { ColumnDef } from '@tanstack/react-table';
import { Check } from 'lucide-react';
import { useMemo } from 'react';
import { download } from '../../client/download';
import { compareJoins, type JoinComparison } from '../../lib/joins/compareJoins';
import { READY_JOINS } from '../../lib/joins/readyJoins';
import { toCsv } from '../../lib/csv/toCsv';
import type { Plan } from '../../lib/plan/plan';
import {
  showDuration,
  showFabric,
  showPrice,
  showSize,
  YARN_UNIT,
  yarnFigure,
  type Units,
} from '../../lib/units/display';
import { Button } from '../ui/Button';
import { DataTable } from '../ui/DataTable';
import { JoinsChart } from './JoinsChart';

interface CompareJoinsProps {
  plan: Plan;
  units: Units;
  /** Takes a join over into the plan. */
  onUse?: (key: string) => void;
}

/** Every ready join on this blanket: table, and the same as a chart. */
export default function CompareJoins({ plan, units, onUse }: CompareJoinsProps) {
  const rows = useMemo(() => compareJoins(plan, READY_JOINS), [plan]);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-6 pb-4">
      <JoinsChart {...{ rows, plan, units }} />
      <DataTable
        caption="Joins on this blanket"
        captionHidden
        rows={rows}
        columns={columnsFor(plan, units, onUse)}
        rowId={({ join }) => join.key}
        initialSorting={[{ id: 'join yarn', desc: false }]}
        empty={<p>No join is known.</p>}
        onExportCsv={(sorted) => download('joins.csv', 'text/csv', joinsCsv(sorted))}
      />
    </div>
  );
}

function columnsFor(
  plan: Plan,
  units: Units,
  onUse?: (key: string) => void,
): ColumnDef<JoinComparison>[] {
  const yarnUnit = YARN_UNIT[units].word;
  const currency = plan.yarn.price?.currency;
  return [
    {
      id: 'join',
      header: 'Join',
      accessorFn: ({ join }) => join.name,
      meta: { rowHeader: true },
      cell: ({ row: { original } }) => (
        <JoinName row={original} inUse={original.join.key === plan.join.key} onUse={onUse} />
      ),
    },
    {
      id: 'join yarn',
      header: `Join, ${yarnUnit}`,
      accessorKey: 'joinM',
      meta: { figures: true },
      cell: ({ row: { original } }) => yarnFigure(original.joinM, units),
    },
    {
      id: 'all yarn',
      header: `All, ${yarnUnit}`,
      accessorKey: 'totalM',
      meta: { figures: true },
      cell: ({ row: { original } }) => yarnFigure(original.totalM, units),
    },
    { id: 'skeins', header: 'Skeins', accessorKey: 'skeins', meta: { figures: true } },
    ...(currency
      ? [
          {
            id: 'cost',
            header: 'Cost',
            accessorKey: 'costMinor',
            meta: { figures: true },
            cell: ({ row: { original } }: { row: { original: JoinComparison } }) =>
              original.costMinor === null ? '' : showPrice(original.costMinor, currency),
          },
        ]
      : []),
    {
      id: 'seam',
      header: 'Seam adds',
      accessorKey: 'seamMm',
      meta: { figures: true },
      cell: ({ row: { original } }) => showFabric(original.seamMm, units),
    },
    {
      id: 'size',
      header: 'Finished',
      accessorKey: 'widthMm',
      meta: { figures: true },
      cell: ({ row: { original } }) => showSize(original.widthMm, original.heightMm, units),
    },
    { id: 'tails', header: 'Tails', accessorKey: 'tails', meta: { figures: true } },
    {
      id: 'time',
      header: 'Time to join',
      accessorKey: 'durationS',
      meta: { figures: true },
      cell: ({ row: { original } }) => showDuration(original.durationS),
    },
  ];
}

function JoinName({
  row,
  inUse,
  onUse,
}: {
  row: JoinComparison;
  inUse: boolean;
  onUse?: (key: string) => void;
}) {
  const { join, fits, fitWords } = row;
  return (
    <div className="max-w-72 min-w-48">
      <b className="block">{join.name}</b>
      <span
        className={fits ? 'block text-sm font-normal text-ink-2' : 'block text-sm text-amber-ink'}
      >
        {fits ? 'Fits' : 'Does not fit'} · {join.surface}, {join.openness}
        {join.reversible ? ', reversible' : ''} · {join.tool}
      </span>
      {!fits && <span className="block text-sm font-normal text-ink-2">{fitWords}</span>}
      {inUse ? (
        <span className="mt-1 inline-flex items-center gap-1 text-sm font-normal">
          <Check size={15} aria-hidden /> in this plan
        </span>
      ) : (
        onUse && (
          <Button kind="quiet" small className="-ms-3" onClick={() => onUse(join.key)}>
            Use {join.name.charAt(0).toLowerCase() + join.name.slice(1)}
          </Button>
        )
      )}
    </div>
  );
}

function joinsCsv(rows: readonly JoinComparison[]): string {
  return toCsv(
    [
      'join',
      'fits',
      'join_m',
      'all_m',
      'skeins',
      'seam_mm',
      'width_mm',
      'height_mm',
      'tails',
      'time_s',
      'cost_minor',
    ],
    rows.map((row) => [
      row.join.name,
      row.fits ? 'yes' : 'no',
      row.joinM,
      row.totalM,
      row.skeins,
      row.seamMm,
      row.widthMm,
      row.heightMm,
      row.tails,
      row.durationS,
      row.costMinor,
    ]),
  );
}

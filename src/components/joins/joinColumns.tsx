import type { ColumnDef } from '@tanstack/react-table';
import { Check } from 'lucide-react';
import type { JoinComparison } from '../../lib/joins/compareJoins';
import type { Plan } from '../../lib/plan/plan';
import { showSize, YARN_UNIT, type Units } from '../../lib/units/display';
import { Button } from '../ui/Button';
import { FIGURES, type Figure } from './figures';

const OPENNESS = ['closed', 'slightly open', 'open'] as const;

/** The columns of joins at one tension. */
export function joinColumns(
  plan: Plan,
  units: Units,
  onUse?: (key: string) => void,
): ColumnDef<JoinComparison>[] {
  const yarnUnit = YARN_UNIT[units].word;
  const currency = plan.yarn.price?.currency;
  const figure = (id: Figure, header: string): ColumnDef<JoinComparison> => ({
    id,
    header,
    accessorFn: FIGURES[id].of,
    meta: { figures: true },
    cell: ({ row: { original } }) => FIGURES[id].show(original, units, currency),
  });
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
    figure('join yarn', `Join, ${yarnUnit}`),
    figure('all yarn', `All, ${yarnUnit}`),
    figure('skeins', 'Skeins'),
    ...(currency ? [figure('cost', 'Cost')] : []),
    figure('seam', 'Seam adds'),
    {
      id: 'size',
      header: 'Finished',
      accessorKey: 'widthMm',
      meta: { figures: true },
      cell: ({ row: { original } }) => showSize(original.widthMm, original.heightMm, units),
    },
    figure('tails', 'Tails'),
    figure('time', 'Time to join'),
    {
      id: 'openness',
      header: 'Openness',
      accessorFn: ({ join }) => OPENNESS.indexOf(join.openness),
      cell: ({ row: { original } }) => original.join.openness,
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
        {fits ? 'Fits' : 'Does not fit'} · {join.surface}
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

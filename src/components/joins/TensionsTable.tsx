import type { ColumnDef } from '@tanstack/react-table';
import { useState } from 'react';
import type { JoinComparison } from '../../lib/joins/compareJoins';
import type { Plan } from '../../lib/plan/plan';
import { YARN_UNIT, type Units } from '../../lib/units/display';
import { DataTable } from '../ui/DataTable';
import { Select } from '../ui/Select';
import { FIGURES, type Figure } from './figures';
import type { Tension } from './tension';

interface TensionsTableProps {
  tensions: readonly Tension[];
  /** For each tension its joins, alike in order. */
  compared: readonly (readonly JoinComparison[])[];
  plan: Plan;
  units: Units;
}

interface JoinRow {
  readonly name: string;
  readonly key: string;
  readonly byTension: readonly JoinComparison[];
}

/** One figure of every join, a column for each hand. */
export function TensionsTable({ tensions, compared, plan, units }: TensionsTableProps) {
  const [figure, setFigure] = useState<Figure>('join yarn');
  const { of, show } = FIGURES[figure];
  const currency = plan.yarn.price?.currency;
  const rows = (compared[0] ?? []).map(({ join }, i): JoinRow => ({
    key: join.key,
    name: join.name,
    byTension: compared.flatMap((comparisons) => comparisons[i] ?? []),
  }));
  const columns: ColumnDef<JoinRow>[] = [
    { id: 'join', header: 'Join', accessorKey: 'name', meta: { rowHeader: true } },
    ...tensions.map(({ id, name }, i): ColumnDef<JoinRow> => ({
      id,
      header: name,
      accessorFn: ({ byTension }) => byTension[i] && of(byTension[i]),
      meta: { figures: true },
      cell: ({ row: { original } }) =>
        original.byTension[i] && show(original.byTension[i], units, currency),
    })),
  ];
  const unit = figure.endsWith('yarn') ? `, ${YARN_UNIT[units].word}` : '';
  return (
    <section>
      <Select
        className="not-printed mb-3 w-60"
        label="Side by side"
        value={figure}
        onChange={({ target }) => setFigure(target.value as Figure)}
        options={Object.entries(FIGURES)
          .filter(([key]) => key !== 'cost' || currency)
          .map(([value, { word }]) => ({ value, word }))}
      />
      <DataTable
        caption={`${FIGURES[figure].word}${unit}`}
        rows={rows}
        columns={columns}
        rowId={({ key }) => key}
        initialSorting={[{ id: tensions[0]?.id ?? 'join', desc: false }]}
        empty={<p>No join is chosen.</p>}
      />
    </section>
  );
}

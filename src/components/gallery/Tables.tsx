import type { ColumnDef } from '@tanstack/react-table';
import { Trash2 } from 'lucide-react';
import { Button } from '../ui/Button';
import { DataTable } from '../ui/DataTable';
import { EmptyState } from '../ui/EmptyState';
import { WoundCard } from '../ui/WoundCard';
import { Section } from './Section';
import { yarns } from './samples';

const lots = Array.from({ length: 4 }, (_, batch) =>
  yarns.map((yarn, index) => ({
    ...yarn,
    id: `${batch}-${index}`,
    lot: `${yarn.lot}${'ABCD'[batch]}`,
    skeins: ((index * 3 + batch * 5) % 9) + 1,
    metres: 200 * (((index * 3 + batch * 5) % 9) + 1) - index * 13,
  })),
).flat();
type Lot = (typeof lots)[number];

const columns: ColumnDef<Lot>[] = [
  {
    accessorKey: 'name',
    header: 'Colour',
    meta: { rowHeader: true },
    cell: ({ row }) => (
      <WoundCard colour={row.original.hex} weight={4} size="sm" name={row.original.name} beside />
    ),
  },
  { accessorKey: 'lot', header: 'Dye lot', meta: { figures: false } },
  { accessorKey: 'skeins', header: 'Skeins', meta: { figures: true } },
  { accessorKey: 'metres', header: 'Metres', meta: { figures: true } },
];

const empty = (
  <EmptyState action={<Button kind="primary">Add a yarn</Button>}>No lots are kept yet.</EmptyState>
);

export function Tables() {
  return (
    <Section title="Tables">
      <DataTable
        caption="Lots in the stash"
        rows={lots}
        columns={columns}
        rowId={(lot) => lot.id}
        empty={empty}
        filterLabel="Find a colour or a lot"
        pageSize={6}
        initialSorting={[{ id: 'name', desc: false }]}
        onExportCsv={() => {}}
        selectable={{
          nameOf: (lot) => `${lot.name}, lot ${lot.lot}`,
          actions: (chosen, clear) => (
            <Button small icon={Trash2} onClick={clear}>
              Remove {chosen.length}
            </Button>
          ),
        }}
      />
      <div className="mt-8 grid gap-8 lg:grid-cols-3">
        <DataTable
          caption="No lots"
          rows={[]}
          columns={columns}
          rowId={(lot) => lot.id}
          empty={empty}
        />
        <DataTable
          caption="Lots on their way"
          rows={[]}
          columns={columns}
          rowId={(lot) => lot.id}
          empty={empty}
          loading
        />
        <DataTable
          caption="Lots that did not come"
          rows={[]}
          columns={columns}
          rowId={(lot) => lot.id}
          empty={empty}
          error={{ message: 'The stash could not be read: no connection.', onRetry: () => {} }}
        />
      </div>
    </Section>
  );
}

import { Trash2 } from 'lucide-react';
import { useMemo } from 'react';
import { download } from '../../../client/download';
import type { Units } from '../../../lib/units/display';
import type { PresentedLot } from '../../../schemas/stash';
import { Button } from '../../ui/Button';
import { DataTable } from '../../ui/DataTable';
import { stashColumns } from './stashColumns';
import { lotName } from './stashWords';

interface StashTableProps {
  lots: readonly PresentedLot[];
  units: Units;
  isDeleting: boolean;
  onLot: (lot: PresentedLot) => void;
  onDelete: (lots: readonly PresentedLot[]) => void;
}

/** Every dye lot as a line: to sort, find, choose and take away as CSV. */
export function StashTable({ lots, units, isDeleting, onLot, onDelete }: StashTableProps) {
  const columns = useMemo(() => stashColumns(units, onLot), [units, onLot]);
  return (
    <DataTable
      caption="Dye lots in your stash"
      captionHidden
      rows={lots}
      columns={columns}
      rowId={({ id }) => id}
      empty={null}
      filterLabel="Find a yarn, colour, lot or place"
      onExportCsv={exportCsv}
      selectable={{
        nameOf: lotName,
        actions: (chosen, clear) => (
          <Button
            icon={Trash2}
            busy={isDeleting && 'Taking out…'}
            onClick={() => {
              onDelete(chosen);
              clear();
            }}
          >
            Take {chosen.length} out of the stash
          </Button>
        ),
      }}
    />
  );
}

async function exportCsv(lots: PresentedLot[]): Promise<void> {
  const { stashCsv } = await import('../../../lib/stash/stashCsv');
  download('stash.csv', 'text/csv', stashCsv(lots));
}

import type { ColumnDef } from '@tanstack/react-table';
import { Checkbox } from './Checkbox';

/** The column of boxes: each row's own, and one for every row that the filter leaves. */
export function selectColumn<Row>(nameOf: (row: Row) => string): ColumnDef<Row> {
  return {
    id: 'select',
    enableSorting: false,
    header: ({ table }) => (
      <Checkbox
        label="Choose all"
        labelHidden
        checked={table.getIsAllRowsSelected()}
        mixed={table.getIsSomeRowsSelected() && !table.getIsAllRowsSelected()}
        onChange={table.getToggleAllRowsSelectedHandler()}
      />
    ),
    cell: ({ row }) => (
      <Checkbox
        label={`Choose ${nameOf(row.original)}`}
        labelHidden
        checked={row.getIsSelected()}
        onChange={row.getToggleSelectedHandler()}
      />
    ),
  };
}

import {
  getCoreRowModel,
  getFilteredRowModel,
  getPaginationRowModel,
  getSortedRowModel,
  useReactTable,
  type ColumnDef,
  type RowData,
  type RowSelectionState,
  type SortingState,
} from '@tanstack/react-table';
import { useState, type ReactNode } from 'react';
import { Button } from './Button';
import { DataTableBody } from './DataTableBody';
import { DataTableHead } from './DataTableHead';
import { DataTablePager } from './DataTablePager';
import { DataTableToolbar } from './DataTableToolbar';
import { Notice } from './Notice';
import { selectColumn } from './selectColumn';
import { Skeleton } from './Skeleton';

declare module '@tanstack/react-table' {
  // eslint-disable-next-line @typescript-eslint/no-unused-vars -- the names must match the library's
  interface ColumnMeta<TData extends RowData, TValue> {
    /** A column of figures: mono, tabular, at the end of its cell. */
    figures?: boolean;
    /** The cell that names its row. */
    rowHeader?: boolean;
  }
}

export interface DataTableProps<Row> {
  /** Names the table; shown above it. */
  caption: string;
  captionHidden?: boolean;
  rows: readonly Row[];
  // eslint-disable-next-line @typescript-eslint/no-explicit-any -- columns of one table differ in their value
  columns: readonly ColumnDef<Row, any>[];
  rowId: (row: Row) => string;
  /** Shown in place of the table when there is nothing to show yet. */
  empty: ReactNode;
  loading?: boolean;
  error?: { message: string; onRetry: () => void };
  /** Label of the filter box; no box without it. */
  filterLabel?: string;
  pageSize?: number;
  initialSorting?: SortingState;
  /** Lets rows be chosen; says what each is called to whoever cannot see it. */
  selectable?: {
    nameOf: (row: Row) => string;
    actions: (chosen: Row[], clear: () => void) => ReactNode;
  };
  /** Gets the rows as filtered and sorted, all pages of them. */
  onExportCsv?: (rows: Row[]) => void;
}

const NO_ROWS: never[] = [];

export function DataTable<Row>(props: DataTableProps<Row>) {
  const { caption, captionHidden, rows, columns, rowId, empty, loading, error, selectable } = props;
  const { filterLabel, pageSize = 25, initialSorting = [], onExportCsv } = props;
  const [rowSelection, setRowSelection] = useState<RowSelectionState>({});
  const [globalFilter, setGlobalFilter] = useState('');

  const table = useReactTable<Row>({
    data: loading || error ? NO_ROWS : (rows as Row[]),
    columns: selectable ? [selectColumn(selectable.nameOf), ...columns] : [...columns],
    getRowId: rowId,
    state: { rowSelection, globalFilter },
    initialState: { pagination: { pageSize, pageIndex: 0 }, sorting: initialSorting },
    onRowSelectionChange: setRowSelection,
    onGlobalFilterChange: setGlobalFilter,
    globalFilterFn: 'includesString',
    enableRowSelection: !!selectable,
    getCoreRowModel: getCoreRowModel(),
    getFilteredRowModel: getFilteredRowModel(),
    getSortedRowModel: getSortedRowModel(),
    getPaginationRowModel: getPaginationRowModel(),
  });

  if (loading) return <Skeleton label={`Loading: ${caption}`} lines={6} />;
  if (error) {
    return (
      <Notice kind="problem" live action={<Button onClick={error.onRetry}>Try again</Button>}>
        {error.message}
      </Notice>
    );
  }
  if (rows.length === 0) return empty;

  const chosen = table.getSelectedRowModel().rows.map((row) => row.original);
  const shown = table.getRowModel().rows;
  return (
    <div>
      <DataTableToolbar
        filterLabel={filterLabel}
        filter={globalFilter}
        onFilter={setGlobalFilter}
        shownCount={table.getFilteredRowModel().rows.length}
        rowCount={rows.length}
        onExportCsv={
          onExportCsv &&
          (() => onExportCsv(table.getSortedRowModel().rows.map((row) => row.original)))
        }
        chosenCount={chosen.length}
        chosenActions={
          chosen.length > 0 && selectable?.actions(chosen, () => table.resetRowSelection(true))
        }
      />
      {/* A wide table scrolls in its own box, which the keyboard can reach. */}
      <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto">
        <table className="w-full border-collapse">
          <caption className={captionHidden ? 'sr-only' : 'pb-2 text-start font-bold'}>
            {caption}
          </caption>
          <DataTableHead table={table} />
          <DataTableBody rows={shown} />
        </table>
        {shown.length === 0 && (
          <p className="border-t border-line px-2.5 py-4 text-ink-2">
            Nothing here matches “{globalFilter}”.{' '}
            <button type="button" className="link" onClick={() => setGlobalFilter('')}>
              Show all
            </button>
          </p>
        )}
      </div>
      <DataTablePager table={table} />
    </div>
  );
}

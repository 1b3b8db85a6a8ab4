import type { Table } from '@tanstack/react-table';
import { ChevronLeft, ChevronRight } from 'lucide-react';
import { Button } from './Button';

/** Nothing at all while one page holds everything. */
export function DataTablePager<Row>({ table }: { table: Table<Row> }) {
  const { pageIndex, pageSize } = table.getState().pagination;
  const count = table.getFilteredRowModel().rows.length;
  if (count <= pageSize) return null;
  const first = pageIndex * pageSize + 1;
  const last = Math.min(count, first + pageSize - 1);
  return (
    <nav aria-label="Pages of the table" className="mt-3 flex items-center gap-3">
      <Button
        small
        icon={ChevronLeft}
        disabled={!table.getCanPreviousPage()}
        onClick={() => table.previousPage()}
      >
        Previous
      </Button>
      <Button
        small
        icon={ChevronRight}
        disabled={!table.getCanNextPage()}
        onClick={() => table.nextPage()}
      >
        Next
      </Button>
      <p role="status" className="text-sm text-ink-2 tabular-nums">
        {first}–{last} of {count}
      </p>
    </nav>
  );
}

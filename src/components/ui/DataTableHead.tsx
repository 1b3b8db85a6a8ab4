import { flexRender, type Header, type Table } from '@tanstack/react-table';
import { ArrowDown, ArrowUp, ChevronsUpDown } from 'lucide-react';
import { classNames } from './classNames';

export function DataTableHead<Row>({ table }: { table: Table<Row> }) {
  return (
    <thead>
      {table.getHeaderGroups().map((group) => (
        <tr key={group.id}>
          {group.headers.map((header) => (
            <HeadCell key={header.id} header={header} />
          ))}
        </tr>
      ))}
    </thead>
  );
}

const ariaSort = { asc: 'ascending', desc: 'descending' } as const;
const sortIcon = { asc: ArrowUp, desc: ArrowDown } as const;

function HeadCell<Row>({ header }: { header: Header<Row, unknown> }) {
  const { column } = header;
  const figures = column.columnDef.meta?.figures;
  const sorted = column.getIsSorted();
  const Icon = sorted ? sortIcon[sorted] : ChevronsUpDown;
  const word = flexRender(column.columnDef.header, header.getContext());
  return (
    <th
      scope="col"
      aria-sort={sorted ? ariaSort[sorted] : undefined}
      className={classNames(
        'px-2.5 py-1 text-sm font-normal text-ink-2',
        figures ? 'text-end' : 'text-start',
        column.id === 'select' && 'w-10',
      )}
    >
      {column.getCanSort() ? (
        <button
          type="button"
          onClick={column.getToggleSortingHandler()}
          className={classNames(
            '-mx-1 inline-flex min-h-7 items-center gap-1 rounded-control px-1 whitespace-nowrap hover:text-ink coarse:min-h-11',
            sorted && 'font-bold text-ink',
            figures && 'flex-row-reverse',
          )}
        >
          {word}
          <Icon size={13} aria-hidden className="shrink-0 print:hidden" />
        </button>
      ) : (
        word
      )}
    </th>
  );
}

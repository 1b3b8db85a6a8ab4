import { flexRender, type Cell, type Row } from '@tanstack/react-table';
import { classNames } from './classNames';

export function DataTableBody<Data>({ rows }: { rows: Row<Data>[] }) {
  return (
    <tbody>
      {rows.map((row) => (
        <tr
          key={row.id}
          className={classNames(
            'border-t border-line',
            row.getIsSelected() ? 'bg-teal-soft' : 'hover:bg-sunk',
          )}
        >
          {row.getVisibleCells().map((cell) => (
            <BodyCell key={cell.id} cell={cell} />
          ))}
        </tr>
      ))}
    </tbody>
  );
}

function BodyCell<Data>({ cell }: { cell: Cell<Data, unknown> }) {
  const { meta, cell: template } = cell.column.columnDef;
  const content = flexRender(template, cell.getContext());
  const look = classNames('px-2.5 py-2', meta?.figures && 'figures text-end');
  return meta?.rowHeader ? (
    <th scope="row" className={classNames(look, 'text-start')}>
      {content}
    </th>
  ) : (
    <td className={look}>{content}</td>
  );
}

// @vitest-environment jsdom
import type { ColumnDef } from '@tanstack/react-table';
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { DataTable, type DataTableProps } from '../../../src/components/ui/DataTable';

afterEach(cleanup);

interface Lot {
  id: string;
  name: string;
  metres: number;
}
const lots: Lot[] = [
  { id: '1', name: 'Oat', metres: 930 },
  { id: '2', name: 'Harbour', metres: 1184 },
  { id: '3', name: 'Rowan', metres: 214 },
];
const columns: ColumnDef<Lot>[] = [
  { accessorKey: 'name', header: 'Colour', meta: { rowHeader: true } },
  { accessorKey: 'metres', header: 'Metres', meta: { figures: true }, sortDescFirst: false },
];

function show(props: Partial<DataTableProps<Lot>> = {}) {
  return render(
    <DataTable
      caption="Lots"
      rows={lots}
      columns={columns}
      rowId={(lot) => lot.id}
      empty={<p>No lots yet.</p>}
      {...props}
    />,
  );
}
const names = () => screen.queryAllByRole('rowheader').map(({ textContent }) => textContent);

describe('DataTable', () => {
  it('sorts by a column both ways, and says so', () => {
    show();
    const sort = screen.getByRole('button', { name: 'Metres' });
    fireEvent.click(sort);
    expect(names()).toEqual(['Rowan', 'Oat', 'Harbour']);
    expect(screen.getByRole('columnheader', { name: 'Metres' }).getAttribute('aria-sort')).toBe(
      'ascending',
    );
    fireEvent.click(sort);
    expect(names()).toEqual(['Harbour', 'Oat', 'Rowan']);
  });

  it('filters, and offers the way back when nothing matches', () => {
    show({ filterLabel: 'Find a colour' });
    const box = screen.getByLabelText('Find a colour');
    fireEvent.change(box, { target: { value: 'har' } });
    expect(names()).toEqual(['Harbour']);
    expect(screen.getByText('1 of 3')).toBeDefined();
    fireEvent.change(box, { target: { value: 'mauve' } });
    fireEvent.click(screen.getByText('Show all'));
    expect(names()).toHaveLength(3);
  });

  it('pages', () => {
    show({ pageSize: 2 });
    expect(names()).toEqual(['Oat', 'Harbour']);
    fireEvent.click(screen.getByRole('button', { name: 'Next' }));
    expect(names()).toEqual(['Rowan']);
    expect(screen.getByText('3–3 of 3')).toBeDefined();
  });

  it('hands the chosen rows to their actions, and lets them be let go', () => {
    show({
      selectable: {
        nameOf: (lot) => lot.name,
        actions: (chosen, clear) => <button onClick={clear}>Remove {chosen.length}</button>,
      },
    });
    fireEvent.click(screen.getByLabelText('Choose Oat'));
    expect(screen.getByLabelText<HTMLInputElement>('Choose all').indeterminate).toBe(true);
    fireEvent.click(screen.getByLabelText('Choose all'));
    fireEvent.click(screen.getByText('Remove 3'));
    expect(screen.getByLabelText<HTMLInputElement>('Choose Oat').checked).toBe(false);
  });

  it('exports what the filter leaves, in the order shown, whatever the page', () => {
    const onExportCsv = vi.fn();
    show({
      filterLabel: 'Find',
      onExportCsv,
      pageSize: 1,
      initialSorting: [{ id: 'metres', desc: true }],
    });
    fireEvent.change(screen.getByLabelText('Find'), { target: { value: 'o' } });
    fireEvent.click(screen.getByRole('button', { name: 'Export CSV' }));
    expect(onExportCsv.mock.lastCall?.[0].map((lot: Lot) => lot.name)).toEqual([
      'Harbour',
      'Oat',
      'Rowan',
    ]);
  });

  it('shows that it is empty, on its way, or not to be had', () => {
    show({ rows: [] });
    expect(screen.getByText('No lots yet.')).toBeDefined();
    cleanup();
    show({ loading: true });
    expect(within(screen.getByRole('status')).getByText('Loading: Lots')).toBeDefined();
    cleanup();
    const onRetry = vi.fn();
    show({ error: { message: 'No connection.', onRetry } });
    expect(screen.getByRole('alert').textContent).toContain('No connection.');
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(onRetry).toHaveBeenCalled();
  });
});

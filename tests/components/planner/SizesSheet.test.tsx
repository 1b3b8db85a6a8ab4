// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { download } from '../../../src/client/download';
import SizesSheet from '../../../src/components/planner/SizesSheet';
import { EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import { BLANKET_SIZES } from '../../../src/lib/sizes/blanketSizes';
import { sizesOf } from '../../../src/lib/sizes/sizesOf';

vi.mock('../../../src/client/download', () => ({ download: vi.fn() }));
afterEach(cleanup);

const change = vi.fn();
const show = () =>
  render(<SizesSheet plan={EXAMPLE_PLAN} units="metric" change={change} onClose={vi.fn()} />);
const columns = () => screen.getAllByRole('columnheader').map((cell) => cell.textContent);

describe('SizesSheet', () => {
  it('has a column for each usual size with its skeins', () => {
    show();
    expect(columns()).toHaveLength(BLANKET_SIZES.length);
    const inAll = within(screen.getByRole('row', { name: /^In all/ })).getAllByRole('cell');
    expect(inAll.map((cell) => cell.textContent)).toEqual(
      sizesOf(EXAMPLE_PLAN, BLANKET_SIZES).map(({ totals }) => `${totals.skeins} skeins`),
    );
  });

  it('takes a size over into the plan as a size wanted', () => {
    show();
    fireEvent.click(screen.getByRole('button', { name: /the size Throw/ }));
    const [edit] = change.mock.lastCall as [(plan: Plan) => Plan];
    // published: a throw of 50 × 70 in
    expect(edit(EXAMPLE_PLAN).size).toEqual({
      by: 'target',
      widthMm: 50 * 25.4,
      heightMm: 70 * 25.4,
      rule: 'nearest',
    });
  });

  it('adds a size of one’s own under a new name, and takes it out again', () => {
    show();
    const name = screen.getByLabelText('A size of your own');
    const add = screen.getByRole('button', { name: 'Add' });
    fireEvent.click(add);
    screen.getByText('Give the size a name');
    fireEvent.change(name, { target: { value: 'Throw' } });
    screen.getByText('There is a size called Throw');
    fireEvent.change(name, { target: { value: 'Sofa back' } });
    fireEvent.click(add);
    expect(columns().at(-1)).toContain('Sofa back');
    fireEvent.click(screen.getByRole('button', { name: 'Download CSV' }));
    expect(vi.mocked(download).mock.lastCall?.[2]).toContain('Sofa back');
    fireEvent.click(screen.getByRole('button', { name: 'Remove Sofa back' }));
    expect(columns()).toHaveLength(BLANKET_SIZES.length);
  });
});

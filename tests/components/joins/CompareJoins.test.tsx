// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import Papa from 'papaparse';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { download } from '../../../src/client/download';
import CompareJoins from '../../../src/components/joins/CompareJoins';
import { compareJoins, EXAMPLE_PLAN, READY_JOINS } from '../../../src/lib';
import { stubWidth } from '../resizeObserver';

vi.mock('../../../src/client/download', () => ({ download: vi.fn() }));
beforeEach(() => stubWidth(900));
afterEach(cleanup);

const rows = compareJoins(EXAMPLE_PLAN, READY_JOINS).toSorted((a, b) => a.joinM - b.joinM);
const names = () =>
  screen.getAllByRole('rowheader').map((cell) => cell.querySelector('b')?.textContent);

describe('CompareJoins', () => {
  it('lists every join, thriftiest first, with its fit', () => {
    render(<CompareJoins plan={EXAMPLE_PLAN} units="metric" terms="us" />);
    expect(names()).toEqual(rows.map(({ join }) => join.name));
    screen.getAllByRole('rowheader').forEach((cell, i) => {
      expect(cell.textContent).toContain(rows[i]?.fits ? 'Fits' : 'Does not fit');
    });
  });

  it('offers each but the one in use', () => {
    const onUse = vi.fn();
    render(<CompareJoins plan={EXAMPLE_PLAN} units="metric" terms="us" onUse={onUse} />);
    expect(screen.getAllByText('in this plan')).toHaveLength(1);
    expect(screen.getAllByRole('button', { name: /^Use / })).toHaveLength(rows.length - 1);
    fireEvent.click(screen.getByRole('button', { name: 'Use whip stitch' }));
    expect(onUse).toHaveBeenCalledWith('whip-stitch');
  });

  it('gives what it shows as CSV, in the order shown and to the last digit', () => {
    render(<CompareJoins plan={EXAMPLE_PLAN} units="imperial" terms="us" />);
    fireEvent.click(screen.getByRole('button', { name: 'Export CSV' }));
    const [name, , text] = vi.mocked(download).mock.lastCall ?? [];
    expect(name).toBe('joins.csv');
    const { data } = Papa.parse<Record<string, string>>(text ?? '', {
      header: true,
      skipEmptyLines: true,
    });
    expect(data.map(({ join_m }) => Number(join_m))).toEqual(rows.map(({ joinM }) => joinM));
    expect(data.map(({ width_mm }) => Number(width_mm))).toEqual(
      rows.map(({ widthMm }) => widthMm),
    );
  });

  it('leaves the cost out where no price is known', () => {
    const plan = { ...EXAMPLE_PLAN, yarn: { ...EXAMPLE_PLAN.yarn, price: null } };
    render(<CompareJoins plan={plan} units="metric" terms="us" />);
    expect(screen.queryByRole('columnheader', { name: /Cost/ })).toBeNull();
  });
});

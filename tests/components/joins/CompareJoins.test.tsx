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

  it('says why the thriftiest is, and draws four motifs joined each way', () => {
    render(<CompareJoins plan={EXAMPLE_PLAN} units="metric" terms="us" />);
    screen.getByText(/^Joined in the last round takes 35\sm less than whip stitch: /);
    expect(screen.getAllByRole('img', { name: /: four motifs, / })).toHaveLength(rows.length);
  });

  it('compares only what is chosen', () => {
    render(<CompareJoins plan={EXAMPLE_PLAN} units="metric" terms="us" />);
    fireEvent.click(screen.getByRole('button', { name: 'Clear all', hidden: true }));
    screen.getByText('Choose at least one join.');
    for (const name of ['Flat braid', 'Reed lace']) {
      fireEvent.click(screen.getByRole('checkbox', { name, hidden: true }));
    }
    expect(names()).toEqual(['Flat braid', 'Reed lace']);
    screen.getByText(/^Flat braid takes 69\sm less than reed lace: /);
  });

  it('sets another person beside the plan, typed in by stitches across a width', () => {
    const swatch = {
      id: 's1',
      name: 'Wide hand',
      swatch: EXAMPLE_PLAN.swatch!,
      weightCategory: null,
    };
    render(<CompareJoins plan={EXAMPLE_PLAN} units="metric" terms="us" kept={[swatch]} />);
    fireEvent.click(screen.getByRole('button', { name: 'Add', hidden: true }));
    screen.getByText('Say whose tension it is');
    const person = screen.getByLabelText('Another person');
    fireEvent.change(person, { target: { value: 'Odile' } });
    fireEvent.click(screen.getByRole('button', { name: 'Add', hidden: true }));
    fireEvent.click(screen.getByRole('checkbox', { name: 'Wide hand', hidden: true }));
    for (const name of ['This plan', 'Odile', 'Wide hand']) {
      screen.getByRole('columnheader', { name: new RegExp(name) });
    }
    fireEvent.click(screen.getByRole('button', { name: 'Export CSV' }));
    const [, , text] = vi.mocked(download).mock.lastCall ?? [];
    const { data } = Papa.parse<Record<string, string>>(text ?? '', {
      header: true,
      skipEmptyLines: true,
    });
    expect(data).toHaveLength(3 * rows.length);
    expect(new Set(data.map(({ tension }) => tension))).toEqual(
      new Set(['This plan', 'Odile', 'Wide hand']),
    );
    // the same swatch without the motifs that were weighed: another yarn
    const metres = (of: string) => Number(data.find(({ tension }) => tension === of)?.join_m);
    expect(metres('Wide hand')).not.toBe(metres('This plan'));
  });
});

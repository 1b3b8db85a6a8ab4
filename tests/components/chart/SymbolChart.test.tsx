import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SymbolChart } from '../../../src/components/chart/SymbolChart';
import { gaugeOf, readPattern } from '../../../src/lib';
import { stubWidth } from '../resizeObserver';

beforeEach(() => stubWidth(400));
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const reading = readPattern(
  'Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3.',
  {
    terms: 'us',
    sides: 0,
  },
);
const gauge = gaugeOf(null, 4);
const show = (terms: 'us' | 'uk' = 'us', onPoint = vi.fn()) =>
  render(
    <SymbolChart {...{ reading, gauge, terms, onPoint }} name="Disc" units="metric" marked={[]} />,
  );

describe('SymbolChart', () => {
  it('says in a table all that it draws', () => {
    show();
    const details = screen
      .getByText('The chart as a table')
      .closest('details') as HTMLDetailsElement;
    details.open = true;
    fireEvent(details, new Event('toggle'));
    const table = screen.getByRole('table', { name: 'Rnd 1', hidden: true });
    const rows = within(table).getAllByRole('row', { hidden: true }).slice(1);
    expect(
      rows.map((row) => within(row).getByRole('rowheader', { hidden: true }).textContent),
    ).toEqual(['3 ch', '11 dc', '1 sl st']);
  });

  it("names its symbols in the person's terms, with their Japanese names", () => {
    show('uk');
    const key = screen.getByRole('list', { name: 'Symbols of this chart' });
    expect(key.textContent).toContain('tr treble');
    expect(within(key).getByText('長編み').getAttribute('lang')).toBe('ja');
  });

  it("names a stitch of one's own as its person does", () => {
    const own = {
      abbreviation: 'lst',
      name: 'long stitch',
      moves: { wraps: 2, draws: 1, throughs: 3 },
      ...{ heightOverWidth: null, takes: 1, symbol: null },
    };
    const options = { terms: 'us', sides: 0, ownStitches: [own] } as const;
    const mine = readPattern('Rnd 1: 12 lst in magic ring; join.', options);
    render(
      <SymbolChart
        {...{ gauge, marked: [], reading: mine, onPoint: vi.fn(), ownStitches: [own] }}
        name="Disc"
        units="metric"
        terms="us"
      />,
    );
    const key = screen.getByRole('list', { name: 'Symbols of this chart' });
    expect(within(key).getByText('lst').parentElement?.textContent).toBe('lst long stitch');
  });

  it('walks from stitch to stitch by the keyboard, looks closer and shows all again', () => {
    const onPoint = vi.fn();
    show('us', onPoint);
    const chart = screen.getByRole('group', { name: /^Chart of Disc/ });
    fireEvent.keyDown(chart, { key: 'ArrowLeft' });
    fireEvent.keyDown(chart, { key: 'ArrowLeft' });
    expect(onPoint).toHaveBeenLastCalledWith({ round: 0, stitch: 1 });
    const view = () =>
      chart.querySelector('svg.keeps-colour')?.getAttribute('viewBox')?.split(' ').map(Number);
    const [, , whole = 0] = view() ?? [];
    fireEvent.keyDown(chart, { key: '+' });
    expect(view()?.[2]).toBeCloseTo(whole / 1.5, 6);
    fireEvent.keyDown(chart, { key: '0' });
    expect(view()?.[2]).toBeCloseTo(whole, 6);
  });
});

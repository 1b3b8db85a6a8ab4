// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import Papa from 'papaparse';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { download } from '../../../src/client/download';
import LedgerSheet from '../../../src/components/planner/LedgerSheet';
import { estimate, EXAMPLE_PLAN, showYarn } from '../../../src/lib';
import { withChangedColour } from '../../../src/lib/plan/edits';

vi.mock('../../../src/client/download', () => ({ download: vi.fn() }));
afterEach(() => {
  cleanup();
  vi.mocked(download).mockClear();
});

const plan = withChangedColour(EXAMPLE_PLAN, 'c1', { name: '=Skerry' });
const result = estimate(plan);

function open(colour: string) {
  const onColour = vi.fn();
  render(
    <LedgerSheet
      {...{ plan, estimate: result, colour, onColour }}
      units="metric"
      terms="uk"
      onClose={() => undefined}
    />,
  );
  return onColour;
}

describe('LedgerSheet', () => {
  it('shows the lines of one colour, in the terms asked for, with their sum', () => {
    const onColour = open('c3');
    const lines = result.ledger.filter((line) => line.colour === 'c3');
    expect(screen.getAllByRole('rowheader')).toHaveLength(lines.length);
    const sumM = lines.reduce((sum, { lengthM }) => sum + lengthM, 0);
    const sum = `${showYarn(sumM, 'metric')} in ${lines.length} lines`;
    expect(screen.getByRole('region', { name: sum })).toBeTruthy();
    expect(screen.getAllByText(/ tr × \d loops × /).length).toBeGreaterThan(0);
    fireEvent.change(screen.getByLabelText('Colour'), { target: { value: 'all' } });
    expect(onColour).toHaveBeenCalledWith('all');
  });

  it('puts the lines in the order they are worked', () => {
    open('c1');
    const words = screen.getAllByRole('rowheader').map((cell) => cell.textContent ?? '');
    const first = (part: RegExp) => words.findIndex((word) => part.test(word));
    expect(first(/braid/i)).toBeLessThan(first(/border round/i));
    expect(words.at(-1)).toContain('Allowance');
  });

  it('gives every line as CSV, to the last digit', () => {
    open('all');
    fireEvent.click(screen.getByRole('button', { name: 'Export CSV' }));
    const [name, type, text] = vi.mocked(download).mock.lastCall ?? [];
    expect([name, type]).toEqual(['ledger.csv', 'text/csv']);
    const { data } = Papa.parse<Record<string, string>>(text ?? '', {
      header: true,
      skipEmptyLines: true,
    });
    const sum = (numbers: number[]) => numbers.toSorted((a, b) => a - b);
    expect(sum(data.map(({ length_m }) => Number(length_m)))).toEqual(
      sum(result.ledger.map(({ lengthM }) => lengthM)),
    );
    expect(data.find(({ part }) => part === 'join')?.colour).toBe("'=Skerry");
  });

  it('sorts by length when asked', () => {
    open('c2');
    const metres = () =>
      screen
        .getAllByRole('row')
        .slice(1)
        .map((row) =>
          Number(within(row).getAllByRole('cell').at(-1)?.textContent?.replaceAll(',', '')),
        );
    fireEvent.click(screen.getByRole('button', { name: 'm' }));
    expect(metres()).toEqual(metres().toSorted((a, b) => b - a));
  });
});

// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiError } from '../../../src/client/api';
import { tickLines } from '../../../src/client/queries/shopping';
import KeptShoppingList from '../../../src/components/shopping/KeptShoppingList';
import { estimate, EXAMPLE_PLAN, shoppingList } from '../../../src/lib';
import type { KeptShoppingList as KeptList } from '../../../src/schemas/shoppingList';

vi.mock('../../../src/client/queries/shopping', () => ({ tickLines: vi.fn() }));
afterEach(cleanup);

const list = shoppingList({ plan: EXAMPLE_PLAN, estimate: estimate(EXAMPLE_PLAN), stash: [] });
const kept = (version: number, bought: string[]): KeptList => ({
  id: '6f0c0a3e-5d3b-4b0e-9b1f-0d9a4f1f2c11',
  version,
  title: 'Porch',
  blanketId: null,
  yarnName: 'Lindry Aran',
  confidence: 0.95,
  createdAt: '2026-12-01T10:00:00.000Z',
  updatedAt: '2026-12-01T10:00:00.000Z',
  ...list,
  lines: list.lines.map((line) => ({
    ...line,
    stash: { match: 'none', colourway: null, weightDiffers: false, lots: [] },
    bought: bought.includes(line.colour),
  })),
});

interface Asked {
  version: number;
  bought: readonly string[];
  answer: (list: KeptList) => void;
  refuse: (error: Error) => void;
}

/** What a server was asked that answers when the test says so. */
const asked: Asked[] = [];
beforeEach(() => {
  asked.length = 0;
  vi.mocked(tickLines).mockImplementation(
    ({ version }, bought) =>
      new Promise((answer, refuse) => asked.push({ version, bought, answer, refuse })),
  );
  render(<KeptShoppingList initial={kept(1, ['c2'])} units="metric" />);
});

const box = (name: string) =>
  screen.getByRole<HTMLInputElement>('checkbox', { name: new RegExp(`^${name}`) });
const ticked = () =>
  screen.getAllByRole<HTMLInputElement>('checkbox').filter((each) => each.checked).length;

describe('KeptShoppingList', () => {
  it('shows a tick at once, and saves one after the other from the version before', async () => {
    fireEvent.click(box('Skerry'));
    fireEvent.click(box('Sloe'));
    expect(ticked()).toBe(3);
    expect(screen.getByText(/^3 of 5 colours bought/)).toBeTruthy();
    await waitFor(() => expect(asked).toHaveLength(1));
    expect(asked[0]).toMatchObject({ version: 1, bought: ['c2', 'c1'] });
    await act(async () => asked[0]?.answer(kept(2, ['c2', 'c1'])));
    await waitFor(() => expect(asked).toHaveLength(2));
    expect(screen.getByText('Saving…')).toBeTruthy();
    expect(asked[1]).toMatchObject({ version: 2, bought: ['c2', 'c1', 'c5'] });
    expect(ticked()).toBe(3);
  });

  it('takes a tick off again', async () => {
    fireEvent.click(box('Barley'));
    expect(ticked()).toBe(0);
    await waitFor(() => expect(asked[0]?.bought).toEqual([]));
  });

  it('shows the list as it is now when it was ticked elsewhere meanwhile', async () => {
    fireEvent.click(box('Skerry'));
    await waitFor(() => expect(asked).toHaveLength(1));
    const current = kept(7, ['c2', 'c3', 'c4']);
    const late = new ApiError(409, {
      code: 'conflict',
      message: 'It was changed elsewhere.',
      current,
    });
    await act(async () => asked[0]?.refuse(late));
    expect(await screen.findByRole('alert')).toBeTruthy();
    expect([box('Skerry').checked, box('Rosehip').checked, ticked()]).toEqual([false, true, 3]);
    fireEvent.click(box('Skerry'));
    await waitFor(() =>
      expect(asked[1]).toMatchObject({ version: 7, bought: ['c2', 'c3', 'c4', 'c1'] }),
    );
  });

  it('keeps what was ticked when the server cannot be reached, and tries again', async () => {
    fireEvent.click(box('Skerry'));
    await waitFor(() => expect(asked).toHaveLength(1));
    await act(async () =>
      asked[0]?.refuse(new ApiError(0, { code: 'offline', message: 'No network.' })),
    );
    expect((await screen.findByRole('alert')).textContent).toContain('No network.');
    expect(box('Skerry').checked).toBe(true);
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    await waitFor(() => expect(asked[1]?.bought).toEqual(['c2', 'c1']));
  });
});

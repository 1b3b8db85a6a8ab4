// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { ConflictNotice } from '../../../src/components/planner/ConflictNotice';
import type { Kept } from '../../../src/components/planner/useAutosave';
import { EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import { withBorder, withRoundColour } from '../../../src/lib/plan/edits';

afterEach(cleanup);

const BASE: Kept = { title: 'Porch', plan: EXAMPLE_PLAN };
const plain: Kept = { ...BASE, plan: withBorder(EXAMPLE_PLAN, 0, 'sc') };
const wide: Kept = {
  ...BASE,
  plan: { ...EXAMPLE_PLAN, size: { by: 'grid', rows: 10, columns: 12 } },
};

function told(mine: Kept, theirs: Kept) {
  const onSettle = vi.fn();
  const conflict = { ...theirs, version: 4 };
  render(<ConflictNotice base={BASE} {...{ mine, conflict, onSettle }} />);
  const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));
  return { onSettle, press, conflict };
}

const both = () => screen.queryByRole('button', { name: 'Keep both changes' });

describe('ConflictNotice', () => {
  it('says what changed there and here, and is read out', () => {
    told(wide, { ...plain, title: 'Porch, plain' });
    expect(screen.getByRole('status').textContent).toContain(
      'There: the title, the border. Here: the size.',
    );
  });

  it('keeps both changes where they are of different parts', () => {
    const { onSettle, press } = told({ ...wide, title: 'Porch, wide' }, plain);
    press('Keep both changes');
    const plan: Plan = { ...wide.plan, border: [] };
    expect(onSettle).toHaveBeenCalledWith({ title: 'Porch, wide', plan });
  });

  it("takes the other's title where only it was changed", () => {
    const { onSettle, press } = told(wide, { ...plain, title: 'Porch, plain' });
    press('Keep both changes');
    expect(onSettle.mock.lastCall?.[0]).toMatchObject({ title: 'Porch, plain' });
  });

  it('keeps one or the other whole', () => {
    const { onSettle, press, conflict } = told(wide, plain);
    press('Keep mine');
    expect(onSettle).toHaveBeenLastCalledWith(wide);
    press('Take theirs');
    expect(onSettle).toHaveBeenLastCalledWith(conflict);
  });

  it('offers no merge of two titles, of one part twice, nor of colours and what names them', () => {
    told({ ...wide, title: 'A' }, { ...plain, title: 'B' });
    expect(both()).toBeNull();
    cleanup();
    told(wide, { ...BASE, plan: { ...EXAMPLE_PLAN, size: { by: 'grid', rows: 9, columns: 9 } } });
    expect(both()).toBeNull();
    cleanup();
    told({ ...BASE, plan: withRoundColour(EXAMPLE_PLAN, 0, 0, 'c5') }, plain);
    expect(both()).toBeNull();
  });
});

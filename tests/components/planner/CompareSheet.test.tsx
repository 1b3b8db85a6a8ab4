// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { getAll } from '../../../src/client/getAll';
import CompareSheet from '../../../src/components/planner/CompareSheet';
import { EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import { stubWidth } from '../resizeObserver';

vi.mock('../../../src/client/getAll', () => ({ getAll: vi.fn() }));
beforeEach(() => {
  stubWidth(900);
  vi.mocked(getAll).mockReset();
});
afterEach(cleanup);

const kept = (id: string, name: string, measurements: object[]) => ({
  id,
  name,
  stitch: 'sc',
  stitches: 20,
  rows: 18,
  measurements,
});
const size = { kind: 'size', measuredOn: '2026-11-30', widthMm: 160, heightMm: 130, blocked: true };

describe('CompareSheet', () => {
  it('compares by the swatches of the account that have a size', async () => {
    vi.mocked(getAll).mockResolvedValue([
      kept('s1', 'Loose as ever', [size]),
      kept('s2', 'Not yet measured', []),
    ]);
    show(true);
    fireEvent.click(await screen.findByRole('checkbox', { name: 'Loose as ever', hidden: true }));
    screen.getByRole('columnheader', { name: /Loose as ever/ });
    expect(screen.queryByText('Not yet measured')).toBeNull();
  });

  it('asks for nobody’s swatches outside an account', () => {
    show(false);
    expect(getAll).not.toHaveBeenCalled();
    expect(screen.queryByText('Swatches you keep')).toBeNull();
  });

  it('takes a join over into the plan', () => {
    const change = show(false);
    fireEvent.click(screen.getByRole('button', { name: 'Use whip stitch' }));
    const [edit] = change.mock.lastCall as [(plan: Plan) => Plan];
    expect(edit(EXAMPLE_PLAN).join).toEqual({ ...EXAMPLE_PLAN.join, key: 'whip-stitch' });
  });
});

function show(inAccount: boolean) {
  const change = vi.fn();
  render(
    <CompareSheet
      plan={EXAMPLE_PLAN}
      units="metric"
      terms="us"
      {...{ change, inAccount }}
      onClose={vi.fn()}
    />,
  );
  return change;
}

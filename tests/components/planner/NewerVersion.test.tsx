import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import NewerVersion from '../../../src/components/planner/NewerVersion';
import { EXAMPLE_PLAN, readyMotif, widthMm, type Motif, type Plan } from '../../../src/lib';
import { presentReadyMotif } from '../../../src/server/presenters/motif';

const KEY = '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41';
const old: Motif = { ...(readyMotif('solid-square', 4) as Motif), key: KEY, version: 1 };
const plan: Plan = { ...EXAMPLE_PLAN, motifs: [old] };
const choice = { key: KEY, sides: 4 as const, name: 'Lock gate', rounds: 8, version: 2 };
const newer = {
  ...presentReadyMotif('group-square'),
  key: KEY,
  readyMade: false,
  version: 2,
  updatedAt: '2026-12-01T10:00:00.000Z',
  name: 'Lock gate',
  motif: { ...readyMotif('group-square', 8), key: KEY, version: 2 },
};

const change = vi.fn();
const fetch = vi.fn<typeof globalThis.fetch>();
beforeEach(() => {
  localStorage.clear();
  change.mockReset();
  fetch.mockReset().mockImplementation(async () => Response.json(newer));
  vi.stubGlobal('fetch', fetch);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});
const show = (of: Plan = plan, kept: typeof choice | undefined = choice) =>
  render(<NewerVersion plan={of} choice={kept} change={change} terms="us" />);

describe('NewerVersion', () => {
  it('says what the newer version does otherwise', async () => {
    show();
    expect(await screen.findByText(/Version 2 of Lock gate, saved 1 December 2026/)).toBeTruthy();
    // A solid square of four rounds counts 60 dc in the last, a group square 48.
    const said = screen.getByText(/planned with version 1/).textContent?.replaceAll('\u00a0', ' ');
    expect(said).toContain('Rnd 4 counts 48 dc instead of 60 dc.');
    expect(said).toContain('It can be worked to 4 rounds more.');
  });

  it('takes the newer one, to as many rounds as before', async () => {
    show();
    fireEvent.click(await screen.findByRole('button', { name: 'Take version 2' }));
    const [edit] = change.mock.calls[0] as [(old: Plan) => Plan];
    const taken = edit(plan).motifs[0];
    expect([taken?.version, taken?.rounds.length]).toEqual([2, 4]);
  });

  it('says so when a measured side goes with the older version', async () => {
    show({ ...plan, motifSideMm: widthMm(130) });
    expect(await screen.findByText(/measured side was of the older one/)).toBeTruthy();
  });

  it('asks no more once the person stays, until there is a still newer one', async () => {
    show();
    fireEvent.click(await screen.findByRole('button', { name: 'Stay with version 1' }));
    cleanup();
    show();
    expect(screen.queryByText(/planned with version 1/)).toBeNull();
    cleanup();
    show(plan, { ...choice, version: 3 });
    expect(await screen.findByText(/planned with version 1/)).toBeTruthy();
  });

  it('says when the motif is kept no longer', () => {
    render(<NewerVersion plan={plan} choice={undefined} change={change} terms="us" />);
    expect(screen.getByText(/no longer kept/)).toBeTruthy();
    expect(fetch).not.toHaveBeenCalled();
  });
});

import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { MotifPage } from '../../../../src/components/islands/motifs/MotifPage';
import type { PresentedMotif, PresentedMotifVersion } from '../../../../src/schemas/motif';
import { presentReadyMotif } from '../../../../src/server/presenters/motif';
import { stubWidth } from '../../resizeObserver';

const KEY = '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41';
const ready = presentReadyMotif('group-square') as PresentedMotif;
const kept = (version: number, name = 'Lock gate', text = ready.pattern.text): PresentedMotif => ({
  ...ready,
  key: KEY,
  readyMade: false,
  version,
  updatedAt: '2026-12-01T10:00:00.000Z',
  name,
  pattern: { ...ready.pattern, name, text },
});
const versions: PresentedMotifVersion[] = [2, 1].map((version) => ({
  version,
  name: 'Lock gate',
  savedAt: '2026-12-01T10:00:00.000Z',
  isCurrent: version === 2,
  rounds: 8,
  problems: { errors: 0, warnings: 0 },
}));

const fetch = vi.fn<typeof globalThis.fetch>();
beforeAll(() => import('../../../../src/components/chart/SymbolChart'));
beforeEach(() => {
  localStorage.clear();
  stubWidth(400);
  fetch.mockReset();
  vi.stubGlobal('fetch', fetch);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = () =>
  render(
    <MotifPage
      presented={kept(2)}
      {...{ versions }}
      stitches={[]}
      made={[]}
      signedIn
      swatches={[]}
      units="metric"
      terms="us"
    />,
  );
const name = () => screen.getByLabelText<HTMLInputElement>('Name of the motif');
const rename = (to: string) => fireEvent.change(name(), { target: { value: to } });
const answer = (path: RegExp, status: number, body: unknown) =>
  fetch.mockImplementation(async (input, init) => {
    if (path.test(String(input)) && init?.method !== 'GET') return Response.json(body, { status });
    return Response.json({ items: versions, total: 2 });
  });
const bodyOf = (call: number): unknown => JSON.parse(String(fetch.mock.calls[call]?.[1]?.body));

describe('a motif of one’s own', () => {
  it('has nothing to save until something is changed', () => {
    show();
    const save = screen.getByRole('button', { name: 'Save as version 3' });
    expect(save.getAttribute('aria-disabled')).toBe('true');
    rename('Sluice');
    expect(save.getAttribute('aria-disabled')).toBe('false');
    expect(screen.getByText('Not saved yet')).toBeTruthy();
  });

  it('is saved as the next version, from the one that was open', async () => {
    answer(new RegExp(`/api/motifs/${KEY}$`), 200, kept(3, 'Sluice'));
    show();
    rename('Sluice');
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 3' }));
    expect(await screen.findByText('Saved as version 3')).toBeTruthy();
    expect(bodyOf(0)).toMatchObject({ name: 'Sluice', version: 2, text: ready.pattern.text });
    expect(localStorage.getItem(`ellwise.pattern.${KEY}`)).toBeNull();
  });

  it('keeps unsaved changes on the device', () => {
    show();
    rename('Sluice');
    cleanup();
    show();
    expect(name().value).toBe('Sluice');
    fireEvent.click(screen.getByRole('button', { name: 'Back to version 2' }));
    expect(name().value).toBe('Lock gate');
  });

  it('asks which to keep when it was saved elsewhere meanwhile, and saves on top of that', async () => {
    answer(new RegExp(`/api/motifs/${KEY}$`), 409, {
      error: { code: 'conflict', message: 'Saved from elsewhere.', current: kept(5, 'Weir') },
    });
    show();
    rename('Sluice');
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 3' }));
    const dialog = await screen.findByRole('dialog');
    expect(within(dialog).getByText('Weir')).toBeTruthy();
    answer(new RegExp(`/api/motifs/${KEY}$`), 200, kept(6, 'Sluice'));
    const before = fetch.mock.calls.length;
    fireEvent.click(within(dialog).getByRole('button', { name: 'Keep yours' }));
    await waitFor(() => expect(fetch.mock.calls.length).toBeGreaterThan(before));
    expect(bodyOf(before)).toMatchObject({ name: 'Sluice', version: 5 });
    expect(await screen.findByText('Saved as version 6')).toBeTruthy();
  });

  it('takes the other when asked to', async () => {
    answer(new RegExp(`/api/motifs/${KEY}$`), 409, {
      error: { code: 'conflict', message: 'Saved from elsewhere.', current: kept(5, 'Weir') },
    });
    show();
    rename('Sluice');
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 3' }));
    const dialog = await screen.findByRole('dialog');
    fireEvent.click(within(dialog).getByRole('button', { name: 'Take the other' }));
    await waitFor(() => expect(name().value).toBe('Weir'));
    expect(screen.getByText('Saved as version 5')).toBeTruthy();
  });

  it('shows what has changed since an older version, and takes that up again', async () => {
    show();
    fireEvent.click(screen.getByText('Versions: 2'));
    const older = kept(1, 'Lock gate', ready.pattern.text.split('\n').slice(0, 2).join('\n'));
    fetch.mockImplementation(async () => Response.json(older));
    fireEvent.click(screen.getByRole('button', { name: 'What has changed' }));
    const dialog = await screen.findByRole('dialog', { name: 'Since version 1' });
    expect(within(dialog).getByText('2 lines the same')).toBeTruthy();
    expect(within(dialog).getAllByText(/added:/)).toHaveLength(1);
    answer(/restore$/, 200, { ...older, version: 3 });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Take version 1 up again' }));
    expect(await screen.findByText('Saved as version 3')).toBeTruthy();
  });
});

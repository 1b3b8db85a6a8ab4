import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SwatchEditor } from '../../../../src/components/islands/swatches/SwatchEditor';
import type { PresentedSwatch } from '../../../../src/schemas/swatch';
import { stubWidth } from '../../resizeObserver';

const yarn = {
  id: '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41',
  name: 'Lindry Aran',
  weightCategory: 4 as const,
  putUp: { massG: 100, lengthM: 200 },
  hex: '#2f5d73',
};
const swatch: PresentedSwatch = {
  id: '9b7a4c02-1f63-4d8e-8f55-0c7e2a9d6b13',
  version: 1,
  updatedAt: '2026-11-08T10:00:00.000Z',
  name: 'Sc in Lindry',
  yarnId: yarn.id,
  yarnName: yarn.name,
  stitch: 'sc',
  stitches: 20,
  rows: 18,
  hookMm: 5,
  notes: '',
  measurements: [
    { kind: 'size', measuredOn: '2026-11-08', widthMm: 150, heightMm: 124, blocked: false },
    { kind: 'weight', measuredOn: '2026-11-08', massG: 15, resolutionG: 1 },
  ],
};

const fetch = vi.fn<typeof globalThis.fetch>();
beforeEach(() => {
  stubWidth(400);
  fetch.mockReset();
  vi.stubGlobal('fetch', fetch);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = (more: Partial<Parameters<typeof SwatchEditor>[0]> = {}) =>
  render(
    <SwatchEditor
      swatch={swatch}
      yarns={[yarn]}
      today="2026-11-09"
      units="metric"
      terms="us"
      {...more}
    />,
  );
const type = (label: string, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
const gauge = () => within(screen.getByRole('region', { name: 'Gauge' }));
const save = () => fireEvent.click(screen.getByRole('button', { name: 'Save swatch' }));
const bodies = () => fetch.mock.calls.map(([, init]) => JSON.parse(String(init?.body)));

describe('SwatchEditor', () => {
  it('tells the gauge and the yarn in a loop of a kept swatch', () => {
    show();
    // 100 / 7.5 and 100 / 6.889.
    expect(gauge().getByText(/13\.3/)).toBeTruthy();
    expect(gauge().getByText(/14\.5/)).toBeTruthy();
    expect(
      within(screen.getByRole('region', { name: 'Yarn per loop' })).getByText(/39\.3/),
    ).toBeTruthy();
  });

  it('works the gauge out anew at every keystroke', () => {
    show();
    type('Stitches', '30');
    expect(gauge().getByText(/20\.0/)).toBeTruthy();
  });

  it('tells the gauge over 4 in to who measures in inches', () => {
    show({ units: 'imperial' });
    // 101.6 / 7.5.
    expect(gauge().getByText(/13\.5/)).toBeTruthy();
  });

  it('names stitches in UK terms to who crochets in them', () => {
    show({ terms: 'uk' });
    expect(screen.getByText('dc, double crochet').tagName).toBe('OPTION');
  });

  it('questions a gauge that its yarn does not usually give, and still saves it', async () => {
    fetch.mockResolvedValueOnce(Response.json({ ...swatch, stitches: 60, version: 2 }));
    show();
    type('Stitches', '60');
    expect(screen.getByText('Is this gauge right?')).toBeTruthy();
    save();
    await waitFor(() => expect(fetch).toHaveBeenCalled());
    expect(bodies()[0]).toMatchObject({ stitches: 60, version: 1 });
  });

  it('refuses what cannot be read and puts the cursor there', async () => {
    show();
    type('Stitches', 'many');
    save();
    expect(await screen.findByText('One thing to put right')).toBeTruthy();
    await waitFor(() => expect(document.activeElement?.id).toBe('stitches'));
    expect(fetch).not.toHaveBeenCalled();
  });

  it('shows both versions of a swatch saved elsewhere, and keeps yours from theirs on', async () => {
    const theirs = { ...swatch, rows: 20, version: 2 };
    fetch.mockResolvedValueOnce(
      Response.json(
        { error: { code: 'conflict', message: 'Saved elsewhere.', current: theirs } },
        { status: 409 },
      ),
    );
    show();
    type('Rows', '19');
    save();
    const dialog = within(await screen.findByRole('dialog'));
    expect(dialog.getByText('19')).toBeTruthy();
    expect(dialog.getByText('20')).toBeTruthy();

    fetch.mockResolvedValueOnce(Response.json({ ...swatch, rows: 19, version: 3 }));
    fireEvent.click(dialog.getByRole('button', { name: 'Keep yours' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(bodies()[1]).toMatchObject({ rows: 19, version: 2 });
  });

  it('takes theirs when that is chosen', async () => {
    const theirs = { ...swatch, rows: 20, version: 2 };
    fetch.mockResolvedValueOnce(
      Response.json(
        { error: { code: 'conflict', message: 'Saved elsewhere.', current: theirs } },
        { status: 409 },
      ),
    );
    show();
    type('Rows', '19');
    save();
    fireEvent.click(await screen.findByRole('button', { name: 'Take the other' }));
    await waitFor(() => expect(screen.getByLabelText<HTMLInputElement>('Rows').value).toBe('20'));
  });
});

import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SwatchTable } from '../../../../src/components/islands/swatches/SwatchTable';
import { saveKey } from '../../../../src/components/islands/swatches/useSwatchFigures';
import type { PresentedSwatch } from '../../../../src/schemas/swatch';
import { stubWidth } from '../../resizeObserver';

const swatch: PresentedSwatch = {
  id: '9b7a4c02-1f63-4d8e-8f55-0c7e2a9d6b13',
  version: 1,
  updatedAt: '2026-11-08T10:00:00.000Z',
  name: 'Sc in Lindry',
  yarnId: null,
  yarnName: null,
  stitch: 'sc',
  stitches: 20,
  rows: 18,
  hookMm: 5,
  notes: '',
  measurements: [
    { kind: 'size', measuredOn: '2026-11-08', widthMm: 150, heightMm: 124, blocked: false },
  ],
};
const restored = { ...swatch, id: '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41' };
/** Not what the swatch comes to, so that it shows where a figure is from. */
const brought = { widthMm: 150, heightMm: 124, stitchWidthMm: 10, rowHeightMm: 5, loopMm: 44 };

let kept: PresentedSwatch[];
beforeEach(() => {
  stubWidth(400);
  kept = [swatch];
  vi.stubGlobal(
    'fetch',
    vi.fn(async (_path: string, { method = 'GET' }: RequestInit = {}) => {
      if (method === 'GET') return Response.json({ items: kept, total: kept.length });
      kept = method === 'DELETE' ? [] : [restored];
      return method === 'DELETE'
        ? new Response(null, { status: 204 })
        : Response.json(restored, { status: 201 });
    }),
  );
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = (more: Partial<Parameters<typeof SwatchTable>[0]> = {}) =>
  render(
    <SwatchTable
      swatches={kept}
      yarns={[]}
      figures={{ [saveKey(swatch)]: brought }}
      units="metric"
      terms="us"
      {...more}
    />,
  );

describe('SwatchTable', () => {
  it('shows the figures that the page brought', () => {
    show();
    expect(screen.getByText('10.0 × 20.0')).toBeTruthy();
    expect(screen.getByText(/^44\.0/)).toBeTruthy();
  });

  it('works out by itself what was saved since', async () => {
    show({ swatches: [{ ...swatch, version: 2 }] });
    // 100 / 7.5 and 100 / 6.889.
    expect(await screen.findByText('13.3 × 14.5', {}, { timeout: 20_000 })).toBeTruthy();
    expect(screen.getByText('not weighed')).toBeTruthy();
  });

  it('deletes what is chosen and brings it back', async () => {
    show();
    fireEvent.click(screen.getByLabelText('Choose Sc in Lindry'));
    fireEvent.click(screen.getByRole('button', { name: 'Delete 1' }));
    expect(await screen.findByText(/^A swatch you count/)).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() =>
      expect(screen.getByRole('link', { name: 'Sc in Lindry' }).getAttribute('href')).toBe(
        `/swatches/${restored.id}`,
      ),
    );
  });

  it('teaches who has no swatch yet', () => {
    show({ swatches: [] });
    expect(screen.getByRole('link', { name: 'Add a swatch' })).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Open an example' })).toBeTruthy();
  });
});

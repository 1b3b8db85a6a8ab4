import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { StashPage } from '../../../../src/components/islands/stash/StashPage';
import type { PresentedLot } from '../../../../src/schemas/stash';
import type { PresentedYarn } from '../../../../src/schemas/yarn';
import { stubWidth } from '../../resizeObserver';

const ids = {
  yarn: '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41',
  colour: '9b7a4c02-1f63-4d8e-8f55-0c7e2a9d6b13',
  lot: '5f0c2a54-7c1e-4c52-9a39-5b2f0f6f0b11',
};
const colour = { id: ids.colour, yarnId: ids.yarn, version: 1, name: 'Skerry', hex: '#2f5d73' };
const yarn: PresentedYarn = {
  id: ids.yarn,
  version: 1,
  updatedAt: '2026-11-08T10:00:00.000Z',
  name: 'Lindry Aran',
  maker: 'Lindry Mill',
  fibre: '100 % wool',
  weightCategory: 4,
  putUp: { massG: 100, lengthM: 200 },
  price: null,
  colourways: [colour],
};
const lot: PresentedLot = {
  id: ids.lot,
  version: 1,
  updatedAt: '2026-11-08T10:00:00.000Z',
  lotCode: '4471',
  location: 'Blue basket',
  pricePaid: null,
  wholeSkeins: 3,
  partSkeins: [{ massG: 62 }],
  colourway: { id: ids.colour, name: 'Skerry', hex: '#2f5d73' },
  yarn: {
    id: ids.yarn,
    name: 'Lindry Aran',
    maker: 'Lindry Mill',
    weightCategory: 4,
    putUp: { massG: 100, lengthM: 200 },
  },
  totalG: 362,
  totalM: 724,
};

/** What the server holds during a test, answered like its routes. */
let kept: { yarns: PresentedYarn[]; lots: PresentedLot[] };
const calls: { method: string; path: string; body: unknown }[] = [];
let refuseNextLot: Response | null = null;

function answer(input: RequestInfo | URL, init: RequestInit = {}): Response {
  const path = String(input).split('?')[0] ?? '';
  const { method = 'GET' } = init;
  const body = init.body ? JSON.parse(String(init.body)) : undefined;
  if (method === 'GET') {
    const items = path === '/api/stash' ? kept.lots : kept.yarns;
    return Response.json({ items, total: items.length });
  }
  calls.push({ method, path, body });
  if (method === 'DELETE') {
    kept.lots = kept.lots.filter(({ id }) => !path.endsWith(id));
    return new Response(null, { status: 204 });
  }
  if (path === '/api/yarns') {
    kept.yarns = [{ ...yarn, ...body, colourways: [] }];
    return Response.json(kept.yarns[0], { status: 201 });
  }
  if (path === '/api/colourways') {
    const made = { ...colour, name: body.name, hex: body.hex };
    kept.yarns = kept.yarns.map((each) => ({ ...each, colourways: [made] }));
    return Response.json(made, { status: 201 });
  }
  if (refuseNextLot) {
    const refusal = refuseNextLot;
    refuseNextLot = null;
    return refusal;
  }
  kept.lots = [lot];
  return Response.json(lot, { status: method === 'POST' ? 201 : 200 });
}

beforeEach(() => {
  stubWidth(400);
  kept = { yarns: [], lots: [] };
  calls.length = 0;
  refuseNextLot = null;
  vi.stubGlobal(
    'fetch',
    vi.fn(async (input: RequestInfo | URL, init?: RequestInit) => answer(input, init)),
  );
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = () => render(<StashPage {...kept} units="metric" terms="us" currency="EUR" />);
const press = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }));
const type = (label: string, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });

describe('StashPage', () => {
  it('teaches who has nothing yet, and fills in an example to look at', () => {
    show();
    press('Fill in an example');
    expect(screen.getByLabelText<HTMLInputElement>('Yarn name').value).toBe('Lindry Aran');
    // 3 × 200 m and 62 g at 2 m/g.
    expect(screen.getByText('724 m', { exact: false, selector: 'b' })).toBeTruthy();
  });

  it('makes yarn, colour and lot in one go, in that order', async () => {
    show();
    press('Fill in an example');
    press('Add to the stash');
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(calls.map(({ path }) => path)).toEqual(['/api/yarns', '/api/colourways', '/api/stash']);
    expect(calls[1]?.body).toMatchObject({ yarnId: ids.yarn, name: 'Skerry' });
    expect(calls[2]?.body).toMatchObject({ colourwayId: ids.colour, wholeSkeins: 3 });
    expect(await screen.findByRole('button', { name: /^Skerry, lot 4471/ })).toBeTruthy();
  });

  it('makes nothing twice when the lot is refused and sent again', async () => {
    refuseNextLot = Response.json(
      {
        error: {
          code: 'invalid',
          message: 'Not right.',
          fields: { 'partSkeins.0.massG': 'A whole skein weighs only 100 g' },
        },
      },
      { status: 400 },
    );
    show();
    press('Fill in an example');
    press('Add to the stash');
    expect((await screen.findAllByText('A whole skein weighs only 100 g')).length).toBe(2);
    expect(document.activeElement?.id).toBe('lot.partSkeins.0.massG');

    press('Add to the stash');
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(calls.map(({ path }) => path)).toEqual([
      '/api/yarns',
      '/api/colourways',
      '/api/stash',
      '/api/stash',
    ]);
  });

  it('sends nothing while something is missing', async () => {
    show();
    press('Fill in an example');
    type('Yarn name', '');
    press('Add to the stash');
    expect(await screen.findByText('One thing to put right')).toBeTruthy();
    expect(calls).toEqual([]);
  });

  it('shows what differs when a lot was saved elsewhere', async () => {
    kept = { yarns: [yarn], lots: [lot] };
    refuseNextLot = Response.json(
      {
        error: {
          code: 'conflict',
          message: 'Saved elsewhere.',
          current: { ...lot, wholeSkeins: 7, version: 2 },
        },
      },
      { status: 409 },
    );
    show();
    press(/^Skerry, lot 4471/);
    type('Whole skeins', '2');
    press('Save');
    const dialog = within(
      await screen.findByRole('dialog', { name: 'Saved from elsewhere in the meantime' }),
    );
    expect(dialog.getByText(/^2 skeins and 62/)).toBeTruthy();
    expect(dialog.getByText(/^7 skeins and 62/)).toBeTruthy();
    fireEvent.click(dialog.getByRole('button', { name: 'Keep yours' }));
    await waitFor(() => expect(calls).toHaveLength(2));
    expect(calls[1]?.body).toMatchObject({ wholeSkeins: 2, version: 2 });
  });

  it('takes a lot out and puts it back as it was', async () => {
    kept = { yarns: [yarn], lots: [lot] };
    show();
    press(/^Skerry, lot 4471/);
    press('Take out of the stash');
    expect(await screen.findByText('Nothing of it in the stash.')).toBeTruthy();
    press('Undo');
    expect(await screen.findByRole('button', { name: /^Skerry, lot 4471/ })).toBeTruthy();
    expect(calls[1]?.body).toEqual({
      colourwayId: ids.colour,
      lotCode: '4471',
      location: 'Blue basket',
      pricePaid: null,
      wholeSkeins: 3,
      partSkeins: [{ massG: 62 }],
    });
  });
});

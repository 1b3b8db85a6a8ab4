import { act, cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { OwnStitchesPanel } from '../../../../src/components/islands/stitches/OwnStitchesPanel';
import { useOwnStitches } from '../../../../src/components/islands/stitches/useOwnStitches';
import { WithQueries } from '../../../../src/components/islands/WithQueries';
import type { OwnStitch } from '../../../../src/lib/pattern';
import type { PresentedOwnStitch } from '../../../../src/schemas/ownStitch';
import { LONG_STITCH } from '../../../support/longStitch';
import { stubWidth } from '../../resizeObserver';

const lst: PresentedOwnStitch = {
  id: '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41',
  version: 1,
  updatedAt: '2026-11-08T10:00:00.000Z',
  ...LONG_STITCH,
};
const { id: _id, version: _version, updatedAt: _updatedAt, ...content } = lst;

const fetch = vi.fn<typeof globalThis.fetch>();
let stitches: readonly OwnStitch[] = [];
let openWith: (abbreviation: string) => void;
const onInsert = vi.fn();

beforeEach(() => {
  stubWidth(400);
  fetch.mockReset();
  onInsert.mockReset();
  localStorage.clear();
  vi.stubGlobal('fetch', fetch);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function Panel({ initial }: { initial: PresentedOwnStitch[] | null }) {
  const own = useOwnStitches({ signedIn: initial !== null, initial: initial ?? [] });
  ({ stitches, openWith } = own);
  return (
    <OwnStitchesPanel
      {...own.panelProps}
      terms="us"
      usedAbbreviations={['lst']}
      onInsert={onInsert}
    />
  );
}

/** Null for a stranger, whose stitches are on the device. */
const show = (initial: PresentedOwnStitch[] | null) =>
  render(
    <WithQueries>
      <Panel initial={initial} />
    </WithQueries>,
  );
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));
const form = async () => within(await screen.findByRole('dialog'));
const type = (label: string, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
const bodies = () => fetch.mock.calls.map(([, init]) => JSON.parse(String(init?.body)));
const stored = (): unknown => JSON.parse(localStorage.getItem('ellwise.stitches') ?? 'null');

describe('a stranger’s stitches', () => {
  it('are added by their moves, used at once and kept on this device', async () => {
    show(null);
    press('Add a stitch');
    await form();
    type('Abbreviation', ' Lst ');
    type('Name', 'long stitch');
    press('One through more');
    // Loops are the sum of the moves; the height is the fit's, and edc has the same moves.
    expect(screen.getByText(/^5.loops, about 2\.15.stitch widths tall$/)).toBeTruthy();
    expect(screen.getByText('the moves of edc')).toBeTruthy();
    press('One through more');
    expect(screen.getByText('like edc, with one through more')).toBeTruthy();
    press('One through fewer');
    press('Add the stitch');
    expect(await screen.findByText('lst is read from now on.')).toBeTruthy();
    expect(stitches).toEqual([content]);
    expect(stored()).toEqual([content]);
    expect(screen.getByText(/^1 wrap, 1 draw, 3 throughs: 5.loops/)).toBeTruthy();
    expect(screen.getByText(/in this text/)).toBeTruthy();
    expect(fetch).not.toHaveBeenCalled();
  });

  it('come back with the next visit, and one by one into the text', async () => {
    localStorage.setItem('ellwise.stitches', JSON.stringify([content]));
    show(null);
    await waitFor(() => expect(stitches).toEqual([content]));
    press('Insert lst into the text');
    expect(onInsert).toHaveBeenCalledWith('lst');
  });

  it.each([
    ['no JSON', '{'],
    ['no list', '{"length":3}'],
    ['nothing', 'null'],
    ['more than was ever written here', `[${'1,'.repeat(200_000)}1]`],
    ['no stitches', JSON.stringify([null, 3, {}, { ...content, abbreviation: '__proto__' }])],
    ['a word of patterns', JSON.stringify([{ ...content, abbreviation: 'dc' }])],
    ['a field too many', JSON.stringify([{ ...content, admin: true }])],
    [
      'moves beyond the limits',
      JSON.stringify([{ ...content, moves: { wraps: 99, draws: 1, throughs: 1 } }]),
    ],
  ])('are none where the device holds %s', async (_, text) => {
    localStorage.setItem('ellwise.stitches', text);
    show(null);
    await screen.findByRole('button', { name: 'Begin with an example' });
    expect(stitches).toEqual([]);
  });

  it('keep the good ones among what the device holds, each once', async () => {
    const renamed = { ...content, name: 'longer stitch' };
    localStorage.setItem('ellwise.stitches', JSON.stringify([content, 'rubbish', renamed]));
    show(null);
    await waitFor(() => expect(stitches).toEqual([renamed]));
  });

  it('go only after a question that says what stays', async () => {
    localStorage.setItem('ellwise.stitches', JSON.stringify([content]));
    show(null);
    await waitFor(() => expect(stitches).toHaveLength(1));
    press('Delete lst');
    const question = within(await screen.findByRole('dialog'));
    expect(question.getByText(/Motifs and blankets kept with it keep theirs/)).toBeTruthy();
    press('Keep it');
    expect(stitches).toHaveLength(1);
    press('Delete lst');
    press('Delete the stitch');
    await waitFor(() => expect(stitches).toEqual([]));
    expect(stored()).toBeNull();
  });
});

describe('the form of a stitch', () => {
  it('warns at once of an abbreviation that patterns have, and refuses it', async () => {
    show(null);
    press('Add a stitch');
    await form();
    type('Abbreviation', 'htr');
    expect(screen.getByText(/Patterns use “htr” already/)).toBeTruthy();
    type('Name', 'mine');
    press('Add the stitch');
    expect(await screen.findByText('One thing to put right')).toBeTruthy();
    await waitFor(() => expect(document.activeElement?.id).toBe('stitch.abbreviation'));
    expect(stored()).toBeNull();
  });

  it('refuses what is missing or cannot be read, in words, and puts the cursor on the first', async () => {
    show(null);
    press('Add a stitch');
    await form();
    type('Wraps', 'many');
    type('Draws', '21');
    press('Add the stitch');
    const summary = within(await screen.findByRole('alert'));
    expect(summary.getByText('Abbreviation is missing')).toBeTruthy();
    expect(summary.getByText('Name of the stitch is missing')).toBeTruthy();
    expect(summary.getByText('Draws must be at most 20')).toBeTruthy();
    await waitFor(() => expect(document.activeElement?.id).toBe('stitch.abbreviation'));
  });

  it('refuses a stitch without a draw or a through', async () => {
    show(null);
    openForm('lst');
    await form();
    type('Name', 'nothing');
    type('Draws', '0');
    type('Throughs', '0');
    expect(screen.getByText('A stitch needs at least one draw or one through.')).toBeTruthy();
    press('Add the stitch');
    expect(
      (await screen.findAllByText('A stitch needs at least one draw or one through')).length,
    ).toBeGreaterThan(0);
  });

  it('refuses a second stitch of one abbreviation', async () => {
    localStorage.setItem('ellwise.stitches', JSON.stringify([content]));
    show(null);
    await waitFor(() => expect(stitches).toHaveLength(1));
    openForm('lst');
    await form();
    type('Name', 'another');
    press('Add the stitch');
    expect((await screen.findAllByText(/You have “lst” already/)).length).toBeGreaterThan(0);
    expect(stitches).toEqual([content]);
  });

  it('opens on a word of the text, as an abbreviation', async () => {
    show(null);
    openForm('Sp.K2');
    await form();
    expect((screen.getByLabelText('Abbreviation') as HTMLInputElement).value).toBe('spk');
  });

  it('keeps a chosen symbol with its stems and strokes, and lets go of it', async () => {
    show(null);
    openForm('lst');
    await form();
    type('Name', 'long stitch');
    type('Throughs', '3');
    fireEvent.click(screen.getByRole('radio', { name: 'popcorn' }));
    type('Stems', '4');
    type('Strokes across each', '2');
    press('Add the stitch');
    await waitFor(() => expect(stitches[0]?.symbol).toEqual({ body: 'popcorn', legs: 4, bars: 2 }));
    press('Change lst');
    await form();
    fireEvent.click(screen.getByRole('radio', { name: 'by its moves' }));
    press('Save');
    await waitFor(() => expect(stitches).toEqual([content]));
  });

  it('asks before typing is thrown away', async () => {
    show(null);
    press('Add a stitch');
    await form();
    type('Name', 'long');
    press('Cancel');
    expect(await screen.findByText('Leave without saving?')).toBeTruthy();
    press('Leave it');
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
  });
});

describe('stitches of an account', () => {
  it('are kept by the server and used at once', async () => {
    const made = { ...lst, abbreviation: 'bul', name: 'bullion', id: crypto.randomUUID() };
    fetch.mockResolvedValueOnce(Response.json(made, { status: 201 }));
    show([lst]);
    const before = stitches;
    openForm('bul');
    await form();
    type('Name', 'bullion');
    type('Throughs', '3');
    press('Add the stitch');
    await waitFor(() => expect(stitches.map((each) => each.abbreviation)).toEqual(['bul', 'lst']));
    expect(before).toEqual([content]);
    expect(bodies()[0]).toEqual({ ...content, abbreviation: 'bul', name: 'bullion' });
    expect(stored()).toBeNull();
  });

  it('show what the server refuses beside its field', async () => {
    const error = {
      code: 'invalid',
      message: 'Not kept.',
      fields: { abbreviation: 'You have this one already' },
    };
    fetch.mockResolvedValueOnce(Response.json({ error }, { status: 400 }));
    show([]);
    openForm('bul');
    await form();
    type('Name', 'bullion');
    press('Add the stitch');
    expect((await screen.findAllByText('You have this one already')).length).toBeGreaterThan(0);
  });

  it('say so when the server cannot be reached, and keep what was typed', async () => {
    fetch.mockRejectedValueOnce(new TypeError('offline'));
    show([]);
    openForm('bul');
    await form();
    type('Name', 'bullion');
    press('Add the stitch');
    expect(await screen.findByText(/could not be reached/)).toBeTruthy();
    expect((screen.getByLabelText('Name') as HTMLInputElement).value).toBe('bullion');
  });

  it('are changed from the version they were read with', async () => {
    fetch.mockResolvedValueOnce(
      Response.json({ ...lst, name: 'taller', heightOverWidth: 2.2, version: 2 }),
    );
    show([lst]);
    press('Change lst');
    await form();
    type('Name', 'taller');
    type('Measured height', '2.2');
    press('Save');
    await waitFor(() =>
      expect(stitches[0]).toMatchObject({ name: 'taller', heightOverWidth: 2.2 }),
    );
    expect(bodies()[0]).toEqual({ ...content, name: 'taller', heightOverWidth: 2.2, version: 1 });
  });

  it('show both versions when another save came first', async () => {
    const theirs = { ...lst, name: 'theirs', version: 2 };
    fetch.mockResolvedValueOnce(
      Response.json(
        { error: { code: 'conflict', message: 'Saved elsewhere.', current: theirs } },
        { status: 409 },
      ),
    );
    show([lst]);
    press('Change lst');
    await form();
    type('Name', 'mine');
    press('Save');
    expect(await screen.findByText('Saved from elsewhere in the meantime')).toBeTruthy();
    expect(screen.getByText('theirs')).toBeTruthy();
  });

  it('go when the server says so', async () => {
    fetch.mockResolvedValueOnce(new Response(null, { status: 204 }));
    show([lst]);
    press('Delete lst');
    press('Delete the stitch');
    await waitFor(() => expect(stitches).toEqual([]));
  });

  it('take along those that were left on the device', async () => {
    const bul = { ...content, abbreviation: 'bul', name: 'bullion' };
    localStorage.setItem('ellwise.stitches', JSON.stringify([content, bul]));
    fetch.mockResolvedValueOnce(
      Response.json({ ...lst, ...bul, id: crypto.randomUUID() }, { status: 201 }),
    );
    show([lst]);
    expect(await screen.findByText(/Two stitches are on this device only: lst, bul/)).toBeTruthy();
    press('Take into the account');
    await waitFor(() => expect(stitches).toEqual([bul, content]));
    // The account had the other one already.
    expect(fetch).toHaveBeenCalledTimes(1);
    expect(stored()).toBeNull();
  });
});

function openForm(abbreviation: string) {
  act(() => openWith(abbreviation));
}

import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ProfileForm } from '../../../../src/components/islands/account/ProfileForm';
import type { Account } from '../../../../src/schemas/user';

const account: Account = {
  id: '5f0c2a54-7c1e-4c52-9a39-5b2f0f6f0b11',
  name: 'Odile',
  email: 'odile@example.com',
  roles: ['maker', 'administrator'],
  preferences: { units: 'metric', terms: 'us', theme: 'system', currency: 'EUR' },
  pendingEmail: null,
  version: 1,
};
const elsewhere: Account = { ...account, name: 'Odile M.', roles: ['teacher'], version: 2 };

const fetch = vi.fn<typeof globalThis.fetch>();
beforeEach(() => {
  fetch.mockReset();
  vi.stubGlobal('fetch', fetch);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const name = () => screen.getByLabelText<HTMLInputElement>('Name');
const press = (word: string) => fireEvent.click(screen.getByRole('button', { name: word }));
const bodies = () => fetch.mock.calls.map(([, init]) => JSON.parse(String(init?.body)));

async function saveTooLate() {
  fetch.mockResolvedValueOnce(
    Response.json(
      { error: { code: 'conflict', message: 'Late.', current: elsewhere } },
      { status: 409 },
    ),
  );
  render(<ProfileForm account={account} />);
  fireEvent.input(name(), { target: { value: 'Odile Marchetti' } });
  press('Save');
  await screen.findByText('Changed elsewhere in the meantime');
}

describe('ProfileForm', () => {
  it('saves working roles with the version it began from, and goes on from the saved one', async () => {
    fetch.mockResolvedValueOnce(Response.json({ ...account, name: 'O.', version: 2 }));
    fetch.mockResolvedValueOnce(Response.json({ ...account, name: 'O. M.', version: 3 }));
    render(<ProfileForm account={account} />);
    fireEvent.input(name(), { target: { value: 'O.' } });
    press('Save');
    await screen.findByText('Saved.');
    fireEvent.input(name(), { target: { value: 'O. M.' } });
    press('Save');
    await waitFor(() => expect(fetch).toHaveBeenCalledTimes(2));
    expect(bodies()).toEqual([
      { name: 'O.', roles: ['maker'], version: 1 },
      { name: 'O. M.', roles: ['maker'], version: 2 },
    ]);
  });

  it('tells what another save says, and keeps what was typed until it is decided', async () => {
    await saveTooLate();
    expect(screen.getByText('Odile M.')).toBeDefined();
    expect(name().value).toBe('Odile Marchetti');
  });

  it('saves what was typed over the other on request', async () => {
    await saveTooLate();
    fetch.mockResolvedValueOnce(
      Response.json({ ...elsewhere, name: 'Odile Marchetti', version: 3 }),
    );
    press('Keep what I typed');
    await screen.findByText('Saved.');
    expect(bodies()[1]).toEqual({ name: 'Odile Marchetti', roles: ['maker'], version: 2 });
  });

  it('takes the other on request', async () => {
    await saveTooLate();
    press('Take the other');
    await waitFor(() => expect(name().value).toBe('Odile M.'));
    expect(screen.getByLabelText<HTMLInputElement>('Teacher').checked).toBe(true);
    expect(fetch).toHaveBeenCalledTimes(1);
  });
});

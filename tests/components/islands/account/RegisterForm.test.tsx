import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { RegisterForm } from '../../../../src/components/islands/account/RegisterForm';

const fetch = vi.fn<typeof globalThis.fetch>();
beforeEach(() => {
  fetch.mockReset();
  vi.stubGlobal('fetch', fetch);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const type = (label: string, value: string) =>
  fireEvent.input(screen.getByLabelText(label), { target: { value } });
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));
const isDescribedBy = (label: string, message: string) => {
  const ids = screen.getByLabelText(label).getAttribute('aria-describedby') ?? '';
  return ids.split(' ').some((id) => document.getElementById(id)?.textContent === message);
};
function fill(email = 'odile@example.com') {
  type('Name', 'Odile Marchetti');
  type('E-mail', email);
  type('Password', 'seventeen skeins');
}

describe('RegisterForm', () => {
  it('shows each error beside its field, keeps what was typed, and goes to the first', async () => {
    render(<RegisterForm />);
    type('Name', 'Odile Marchetti');
    type('E-mail', 'odile@example');
    type('Password', 'skeins');
    press('Register');
    await waitFor(() => expect(document.activeElement).toBe(screen.getByLabelText('E-mail')));
    expect(isDescribedBy('E-mail', 'Enter an address like name@example.com.')).toBe(true);
    expect(isDescribedBy('Password', 'Use at least 10 characters; this has 6.')).toBe(true);
    expect(screen.getByLabelText<HTMLInputElement>('E-mail').value).toBe('odile@example');
    expect(screen.getByLabelText<HTMLInputElement>('Password').value).toBe('skeins');
    expect(fetch).not.toHaveBeenCalled();
  });

  it('asks for at least one role', async () => {
    render(<RegisterForm />);
    fill();
    fireEvent.click(screen.getByLabelText('Maker'));
    press('Register');
    await screen.findByText('Choose at least one.');
    expect(screen.getByRole('group', { name: 'I work as' }).getAttribute('aria-describedby')).toBe(
      'roles-error',
    );
  });

  it("shows the server's errors in the same places", async () => {
    const fields = { email: 'An address nobody can have.' };
    fetch.mockResolvedValue(
      Response.json({ error: { code: 'invalid', message: 'One field.', fields } }, { status: 400 }),
    );
    render(<RegisterForm />);
    fill();
    press('Register');
    await waitFor(() => expect(isDescribedBy('E-mail', fields.email)).toBe(true));
    expect(document.activeElement).toBe(screen.getByLabelText('E-mail'));
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it('says what belongs to no field, and keeps what was typed', async () => {
    fetch.mockRejectedValue(new TypeError('Failed to fetch'));
    render(<RegisterForm />);
    fill();
    press('Register');
    const alert = await screen.findByRole('alert');
    expect(alert.textContent).toContain('The server could not be reached.');
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('Odile Marchetti');
  });

  it('says where the letter went, and sends it again when asked', async () => {
    fetch.mockResolvedValueOnce(Response.json({ isMailSent: true }, { status: 201 }));
    fetch.mockResolvedValueOnce(Response.json({ isAccepted: true }));
    render(<RegisterForm />);
    fill('Odile@Example.com');
    press('Register');
    await screen.findByText('odile@example.com');
    press('Send the letter again');
    await screen.findByText('Sent again. It can take a few minutes.');
    expect(fetch.mock.calls[1]?.[0]).toBe('/api/account/resend-confirmation');
    expect(fetch.mock.calls[1]?.[1]?.body).toBe('{"email":"odile@example.com"}');
  });

  it('says so when the letter could not be sent', async () => {
    fetch.mockResolvedValue(Response.json({ isMailSent: false }, { status: 201 }));
    render(<RegisterForm />);
    fill();
    press('Register');
    await screen.findByText('The letter did not leave');
  });

  it('shows the password on request', () => {
    render(<RegisterForm />);
    const input = screen.getByLabelText<HTMLInputElement>('Password');
    expect(input.type).toBe('password');
    press('Show the password');
    expect(input.type).toBe('text');
  });
});

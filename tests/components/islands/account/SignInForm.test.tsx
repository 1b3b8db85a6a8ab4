import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { renderToStaticMarkup } from 'react-dom/server';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SignInForm } from '../../../../src/components/islands/account/SignInForm';

const fetch = vi.fn<typeof globalThis.fetch>();
beforeEach(() => {
  fetch.mockReset();
  vi.stubGlobal('fetch', fetch);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const form = <SignInForm csrfToken="token" returnTo="/stash" refusal={null} />;
const answerWith = (query: string) =>
  fetch.mockResolvedValueOnce(Response.json({ url: `http://ellwise.test/sign-in${query}` }));

async function signIn() {
  render(form);
  const type = (label: string, value: string) =>
    fireEvent.input(screen.getByLabelText(label), { target: { value } });
  type('E-mail', 'odile@example.com');
  type('Password', 'seventeen skeins');
  fireEvent.click(screen.getByRole('button', { name: 'Sign in' }));
  await waitFor(() => expect(fetch).toHaveBeenCalled());
}

describe('SignInForm', () => {
  it('works without script: its fields and address are those of Auth.js', () => {
    const html = renderToStaticMarkup(form);
    expect(html).toContain('method="post"');
    expect(html).toContain('action="/api/auth/callback/credentials"');
    expect(html).toContain('<input type="hidden" name="csrfToken" value="token"/>');
    expect(html).toContain('<input type="hidden" name="callbackUrl" value="/stash"/>');
    expect(html).toMatch(/<input[^>]*name="email"/);
    expect(html).toMatch(/<input[^>]*name="password"/);
  });

  it('sends the token and where to go with the form', async () => {
    answerWith('?error=CredentialsSignin&code=wrong');
    await signIn();
    const [address, init] = fetch.mock.calls[0] ?? [];
    expect(address).toBe('/api/auth/callback/credentials');
    expect(JSON.parse(String(init?.body))).toEqual({
      email: 'odile@example.com',
      password: 'seventeen skeins',
      csrfToken: 'token',
      callbackUrl: '/stash',
    });
    await screen.findByRole('alert');
  });

  it('says that the two do not belong together, with the cursor in the password', async () => {
    answerWith('?error=CredentialsSignin&code=wrong');
    await signIn();
    await screen.findByText(/E-mail and password do not belong together/);
    expect(document.activeElement).toBe(screen.getByLabelText('Password'));
  });

  it('offers the letter again to whoever is still to confirm', async () => {
    answerWith('?error=CredentialsSignin&code=unconfirmed');
    await signIn();
    await screen.findByText(/still to be confirmed/);
    fetch.mockResolvedValueOnce(Response.json({ isAccepted: true }));
    fireEvent.click(screen.getByRole('button', { name: 'Send the letter again' }));
    await screen.findByText('Sent again. It can take a few minutes.');
  });

  it('says why a form sent without script was refused', () => {
    const html = renderToStaticMarkup(
      <SignInForm csrfToken="token" returnTo="/" refusal="too-many" />,
    );
    expect(html).toContain('Too many tries.');
  });
});

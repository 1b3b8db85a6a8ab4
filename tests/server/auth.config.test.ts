import { randomUUID } from 'node:crypto';
import { Auth } from '@auth/core';
import { describe, expect, it, vi } from 'vitest';
import { noteClientAddress } from '../../src/server/clientAddress';
import { ORIGIN } from '../support/callRoute';
import { buildUserRow, PASSWORD } from '../support/factories';

vi.hoisted(() => {
  process.env.AUTH_SECRET = 'a secret of the tests, which is long enough';
});
const { default: authConfig } = await import('../../src/server/auth.config');

/** A browser's part of signing in: the CSRF token and its cookie, then the form. */
async function signIn(fields: Record<string, string>, { asJson = true, csrf = true } = {}) {
  const csrfAnswer = await Auth(new Request(`${ORIGIN}/api/auth/csrf`), authConfig);
  const { csrfToken } = await csrfAnswer.json();
  const cookie = csrfAnswer.headers
    .getSetCookie()
    .map((line) => line.split(';')[0])
    .join('; ');
  const request = new Request(`${ORIGIN}/api/auth/callback/credentials`, {
    method: 'POST',
    headers: { cookie, ...(asJson && { 'X-Auth-Return-Redirect': '1' }) },
    body: new URLSearchParams({ ...fields, ...(csrf && { csrfToken }) }),
  });
  noteClientAddress(request, randomUUID());
  return Auth(request, authConfig);
}
const sessionCookie = (answer: Response) =>
  answer.headers.getSetCookie().find((line) => line.startsWith('authjs.session-token='));
const session = async (cookie: string) => {
  const request = new Request(`${ORIGIN}/api/auth/session`, { headers: { cookie } });
  return (await Auth(request, authConfig)).json();
};

describe('auth.config', () => {
  it('signs in with a cookie that script cannot read and other sites cannot use', async () => {
    const { email } = await buildUserRow();
    const answer = await signIn({ email, password: PASSWORD });
    const cookie = sessionCookie(answer);
    expect(cookie).toContain('HttpOnly');
    expect(cookie).toContain('SameSite=Lax');
    expect(cookie).toContain('Path=/');
  });

  it('puts neither name, address nor roles into the token or the session', async () => {
    const { id, email } = await buildUserRow({ roles: ['seller'] });
    const cookie = sessionCookie(await signIn({ email, password: PASSWORD }))!.split(';')[0]!;
    const { user } = await session(cookie);
    expect(user).toEqual({ id });
  });

  it('ends the session when the token version is raised', async () => {
    const row = await buildUserRow();
    const cookie = sessionCookie(await signIn({ email: row.email, password: PASSWORD }))!;
    await row.update({ tokenVersion: 2 });
    expect(await session(cookie.split(';')[0]!)).toBeNull();
  });

  it.each([
    ['wrong', { password: 'not mine' }, true],
    ['unconfirmed', { password: PASSWORD }, false],
  ])('answers %s as a code, and writes nothing to the log', async (code, fields, isConfirmed) => {
    const { email } = await buildUserRow({ isConfirmed });
    const logged = vi.spyOn(console, 'error');
    const { url } = await (await signIn({ email, ...fields })).json();
    expect(url).toBe(`${ORIGIN}/sign-in?error=CredentialsSignin&code=${code}`);
    expect(logged).not.toHaveBeenCalled();
  });

  it('sends a form without script back to the page', async () => {
    const { email } = await buildUserRow();
    const good = await signIn(
      { email, password: PASSWORD, callbackUrl: '/stash' },
      { asJson: false },
    );
    const bad = await signIn({ email, password: 'not mine' }, { asJson: false });
    expect([good.status, good.headers.get('location')]).toEqual([302, `${ORIGIN}/stash`]);
    expect(bad.headers.get('location')).toBe(
      `${ORIGIN}/sign-in?error=CredentialsSignin&code=wrong`,
    );
  });

  it('never leads to another site', async () => {
    const { email } = await buildUserRow();
    for (const callbackUrl of ['https://elsewhere.test/', '//elsewhere.test']) {
      const { url } = await (await signIn({ email, password: PASSWORD, callbackUrl })).json();
      expect(new URL(url).origin).toBe(ORIGIN);
    }
  });

  it('takes no form without its CSRF token', async () => {
    const { email } = await buildUserRow();
    const answer = await signIn({ email, password: PASSWORD }, { csrf: false });
    expect(sessionCookie(answer)).toBeUndefined();
  });
});

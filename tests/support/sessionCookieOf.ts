import type { AstroCookies } from 'astro';
import { setSessionCookie } from '../../src/server/sessionCookie';
import { ORIGIN } from './callRoute';

process.env.AUTH_SECRET ??= 'a secret of the tests, which is long enough';

/** The cookie header of a browser in which the person is signed in. */
export async function sessionCookieOf(user: { id: string; tokenVersion: number }): Promise<string> {
  let header = '';
  const cookies = {
    set: (name: string, value: string) => void (header = `${name}=${value}`),
  } as unknown as AstroCookies;
  await setSessionCookie(cookies, new URL(ORIGIN), user);
  return header;
}

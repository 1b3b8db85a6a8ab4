import { encode } from '@auth/core/jwt';
import type { AstroCookies } from 'astro';
import { sessionCookieName } from './session';

const SESSION_MAX_AGE_S = 30 * 24 * 60 * 60;

/** Begins the session anew in this browser: the same cookie that signing in sets. */
export async function setSessionCookie(
  cookies: AstroCookies,
  url: URL,
  { id, tokenVersion }: { id: string; tokenVersion: number },
): Promise<void> {
  const name = sessionCookieName(url);
  const token = await encode({
    token: { sub: id, tokenVersion },
    secret: process.env.AUTH_SECRET!,
    salt: name,
    maxAge: SESSION_MAX_AGE_S,
  });
  cookies.set(name, token, {
    httpOnly: true,
    maxAge: SESSION_MAX_AGE_S,
    path: '/',
    sameSite: 'lax',
    secure: url.protocol === 'https:',
  });
}

export function clearSessionCookie(cookies: AstroCookies, url: URL): void {
  cookies.delete(sessionCookieName(url), { path: '/' });
}

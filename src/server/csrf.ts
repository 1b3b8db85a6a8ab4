import { Auth } from '@auth/core';
import type { AstroCookies } from 'astro';
import authConfig from './auth.config';

/**
 * The token that Auth.js asks for with a sign-in, for a form that must work without script. Its
 * other half is a cookie, which is passed on unless the browser has it already.
 */
export async function csrfTokenFor(request: Request, cookies: AstroCookies): Promise<string> {
  const address = new URL(`${authConfig.basePath}/csrf`, request.url);
  const cookie = request.headers.get('cookie') ?? '';
  const answer = await Auth(new Request(address, { headers: { cookie } }), authConfig);
  for (const line of answer.headers.getSetCookie()) {
    const [pair = ''] = line.split(';');
    const separator = pair.indexOf('=');
    cookies.set(pair.slice(0, separator), decodeURIComponent(pair.slice(separator + 1)), {
      httpOnly: true,
      path: '/',
      sameSite: 'lax',
      secure: address.protocol === 'https:',
    });
  }
  const { csrfToken } = await answer.json();
  return csrfToken;
}

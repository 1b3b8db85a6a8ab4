import { randomUUID } from 'node:crypto';
import { expect, type APIResponse, type Page } from '@playwright/test';

export interface Person {
  name: string;
  email: string;
  password: string;
}

/** Somebody who has no account yet; no two are the same. */
export function somebody(name = 'Ineke Vos'): Person {
  return { name, email: `${randomUUID()}@example.com`, password: 'wool over the chair back' };
}

/** The newest link sent to somebody, from the page of caught letters; some are sent in the background. */
export async function linkSentTo(page: Page, email: string, subject: string): Promise<string> {
  const letters = page
    .getByRole('listitem')
    .filter({ hasText: email })
    .filter({ has: page.getByRole('heading', { name: subject }) });
  await expect(async () => {
    await page.goto('/dev/mail');
    await expect(letters.first()).toBeVisible({ timeout: 500 });
  }).toPass();
  return (await letters.first().getByRole('link').getAttribute('href')) ?? '';
}

/** An account that is registered, confirmed and signed in on this page's device, without its forms. */
export async function signedUp(page: Page, person = somebody()): Promise<Person> {
  await send(page, 'POST', '/api/account/register', { ...person, roles: ['maker'] }, 201);
  const link = await linkSentTo(page, person.email, 'Confirm your e-mail address');
  const token = new URL(link).searchParams.get('token');
  await send(page, 'POST', '/api/account/confirm', { token });
  await signIn(page, person);
  return person;
}

/** Signs in on this page's device, without the form. */
export async function signIn(page: Page, { email, password }: Person): Promise<void> {
  const { csrfToken } = await (await page.request.get('/api/auth/csrf')).json();
  await send(
    page,
    'POST',
    '/api/auth/callback/credentials',
    { email, password, csrfToken, callbackUrl: '/' },
    200,
    { 'x-auth-return-redirect': '1' },
  );
  const me = await page.request.get('/api/me');
  expect(me.status()).toBe(200);
}

/** Calls the API as this page's device would. */
export async function send<T = unknown>(
  page: Page,
  method: 'GET' | 'POST' | 'PUT' | 'DELETE',
  path: string,
  data?: unknown,
  status = 200,
  headers: Record<string, string> = {},
): Promise<T> {
  const { origin } = new URL((await page.request.get('/healthz')).url());
  const answer: APIResponse = await page.request.fetch(path, {
    method,
    data,
    headers: { origin, ...headers },
  });
  expect(answer.status(), `${method} ${path}: ${await answer.text()}`).toBe(status);
  const text = await answer.text();
  return text === '' ? (undefined as T) : (JSON.parse(text) as T);
}

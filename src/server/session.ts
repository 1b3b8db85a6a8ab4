import { getToken } from '@auth/core/jwt';
import type { APIContext, AstroCookies } from 'astro';
import { User } from '../../db/models';
import { preferencesSchema, DEFAULT_PREFERENCES, type Preferences } from '../schemas/preferences';
import type { CurrentUser } from '../schemas/user';
import { presentCurrentUser, presentPreferences } from './presenters/user';

export interface Caller {
  user: CurrentUser | null;
  preferences: Preferences;
}

/** The name Auth.js gives its session cookie; also the salt of the key that encrypts it. */
export function sessionCookieName(url: URL): string {
  return `${url.protocol === 'https:' ? '__Secure-' : ''}authjs.session-token`;
}

/**
 * Who is calling. The cookie only says which account and at which token version; the account, its
 * roles and whether that version still counts are read from the database each time.
 */
export async function readCaller(context: APIContext): Promise<Caller> {
  const { locals, cookies } = context;
  if (locals.user !== undefined) {
    return { user: locals.user, preferences: locals.preferences ?? cookiePreferences(cookies) };
  }
  const row = await readAccountRow(context.request, context.url);
  return row
    ? { user: presentCurrentUser(row), preferences: presentPreferences(row) }
    : { user: null, preferences: cookiePreferences(cookies) };
}

async function readAccountRow(request: Request, url: URL): Promise<User | null> {
  const cookieName = sessionCookieName(url);
  if (!request.headers.get('cookie')?.includes(cookieName)) return null;
  const token = await getToken({
    req: request,
    secret: process.env.AUTH_SECRET,
    cookieName,
    salt: cookieName,
  }).catch(() => null);
  return token?.sub ? findSessionUser(token.sub, token.tokenVersion) : null;
}

/** The confirmed account of a session, unless its password was reset or changed since. */
export async function findSessionUser(id: string, tokenVersion: unknown): Promise<User | null> {
  const row = await User.findByPk(id, { include: 'roleRows' });
  return row && row.emailConfirmedAt && row.tokenVersion === tokenVersion ? row : null;
}

/** Preferences of someone without an account; a cookie that makes no sense is as if not there. */
export function cookiePreferences(cookies: AstroCookies): Preferences {
  const preferences: Record<string, string> = { ...DEFAULT_PREFERENCES };
  for (const [name, schema] of Object.entries(preferencesSchema.shape)) {
    const result = schema.safeParse(cookies.get(name)?.value);
    if (result.success) preferences[name] = result.data;
  }
  return preferences as Preferences;
}

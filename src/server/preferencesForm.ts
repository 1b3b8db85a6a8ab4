import type { AstroCookies } from 'astro';
import { sitePathOr } from '../schemas/address';
import {
  preferencesChangeSchema,
  preferencesSchema,
  type PreferencesChange,
} from '../schemas/preferences';
import { fieldErrors } from '../schemas/schema';
import type { CurrentUser } from '../schemas/user';
import { changePreferences } from './commands/changePreferences';
import { inTransaction } from './inTransaction';
import { readText } from './readJson';

const YEAR_S = 365 * 24 * 60 * 60;

interface SentForm {
  request: Request;
  url: URL;
  cookies: AstroCookies;
  user: CurrentUser | null;
}

/** Takes the form that every page's switches send: where to go back to, or what is wrong with it. */
export async function takePreferencesForm({
  request,
  url,
  cookies,
  user,
}: SentForm): Promise<{ goTo: string } | { fields: Record<string, string> }> {
  const sent = new URLSearchParams(await readText(request).catch(() => ''));
  const named = Object.keys(preferencesSchema.shape).filter((name) => sent.has(name));
  const result = preferencesChangeSchema.safeParse(
    Object.fromEntries(named.map((name) => [name, sent.get(name)])),
  );
  if (!result.success) return { fields: fieldErrors(result.error) };

  if (user)
    await inTransaction((transaction) => changePreferences(user.id, result.data, transaction));
  rememberInCookies(result.data, cookies, url);
  return { goTo: sitePathOr('/', sent.get('returnTo')) };
}

/** With an account too: whoever signs out keeps seeing things as they were. */
function rememberInCookies(change: PreferencesChange, cookies: AstroCookies, url: URL): void {
  for (const [name, value] of Object.entries(change)) {
    cookies.set(name, value, {
      httpOnly: true,
      maxAge: YEAR_S,
      path: '/',
      sameSite: 'lax',
      secure: url.protocol === 'https:',
    });
  }
}

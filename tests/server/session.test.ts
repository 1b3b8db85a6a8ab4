import type { AstroCookies } from 'astro';
import { describe, expect, it } from 'vitest';
import { UserRole } from '../../db/models';
import { GET as me } from '../../src/pages/api/me';
import { cookiePreferences } from '../../src/server/session';
import { callRoute } from '../support/callRoute';
import { buildUserRow } from '../support/factories';
import { sessionCookieOf } from '../support/sessionCookieOf';

const askWith = (cookie: string) => callRoute(me, { headers: { cookie }, withSession: true });

describe('readCaller', () => {
  it('knows the account of the cookie, with the roles it has now', async () => {
    const row = await buildUserRow({ roles: ['maker'] });
    const cookie = await sessionCookieOf(row);
    await UserRole.create({ userId: row.id, role: 'teacher' });
    const { status, json } = await askWith(cookie);
    expect(status).toBe(200);
    expect(json.roles).toEqual(['maker', 'teacher']);
  });

  it('knows nobody by a cookie that is missing, made up, changed or cut', async () => {
    const cookie = await sessionCookieOf(await buildUserRow());
    const other = await sessionCookieOf(await buildUserRow());
    const mixed = `${cookie.slice(0, -20)}${other.slice(-20)}`;
    for (const bad of ['', 'authjs.session-token=x', mixed, cookie.slice(0, 60)]) {
      expect((await askWith(bad)).status).toBe(401);
    }
  });

  it('knows nobody by the cookie of a deleted, an unconfirmed or an older session', async () => {
    const deleted = await buildUserRow();
    const deletedCookie = await sessionCookieOf(deleted);
    await deleted.destroy();
    const unconfirmed = await sessionCookieOf(await buildUserRow({ isConfirmed: false }));
    const row = await buildUserRow();
    const older = await sessionCookieOf(row);
    await row.update({ tokenVersion: 2 });
    for (const cookie of [deletedCookie, unconfirmed, older]) {
      expect((await askWith(cookie)).status).toBe(401);
    }
  });
});

describe('cookiePreferences', () => {
  const read = (values: Record<string, string>) =>
    cookiePreferences({
      get: (name: string) => (name in values ? { value: values[name] } : undefined),
    } as unknown as AstroCookies);

  it('is metric, US terms, the system theme and euros before anything was chosen', () => {
    expect(read({})).toEqual({ units: 'metric', terms: 'us', theme: 'system', currency: 'EUR' });
  });

  it('takes what makes sense and passes over what does not', () => {
    expect(read({ units: 'imperial', theme: '"><script>', currency: 'GBP' })).toEqual({
      units: 'imperial',
      terms: 'us',
      theme: 'system',
      currency: 'GBP',
    });
  });
});

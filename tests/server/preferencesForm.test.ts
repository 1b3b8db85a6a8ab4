import type { AstroCookies } from 'astro';
import { describe, expect, it } from 'vitest';
import { User } from '../../db/models';
import type { CurrentUser } from '../../src/schemas/user';
import { takePreferencesForm } from '../../src/server/preferencesForm';
import { ORIGIN } from '../support/callRoute';
import { buildUser } from '../support/factories';

async function send(fields: Record<string, string>, user: CurrentUser | null = null) {
  const cookies: Record<string, string> = {};
  const url = new URL('/preferences', ORIGIN);
  const request = new Request(url, { method: 'POST', body: new URLSearchParams(fields) });
  const jar = { set: (name: string, value: string) => void (cookies[name] = value) };
  const taken = await takePreferencesForm({
    request,
    url,
    user,
    cookies: jar as unknown as AstroCookies,
  });
  return { taken, cookies };
}

describe('takePreferencesForm', () => {
  it('keeps what is named in cookies, and goes back', async () => {
    const { taken, cookies } = await send({ units: 'imperial', returnTo: '/stash?page=2' });
    expect(taken).toEqual({ goTo: '/stash?page=2' });
    expect(cookies).toEqual({ units: 'imperial' });
  });

  it('keeps it with the account as well', async () => {
    const user = await buildUser();
    const { cookies } = await send({ terms: 'uk', currency: 'GBP' }, user);
    expect(await User.findByPk(user.id)).toMatchObject({
      units: 'metric',
      terms: 'uk',
      currency: 'GBP',
    });
    expect(cookies).toEqual({ terms: 'uk', currency: 'GBP' });
  });

  it('changes nothing when one of the fields is wrong', async () => {
    const user = await buildUser();
    const { taken, cookies } = await send({ units: 'imperial', theme: 'sepia' }, user);
    expect(taken).toEqual({ fields: { theme: 'Choose system, light or dark.' } });
    expect(cookies).toEqual({});
    expect((await User.findByPk(user.id))?.units).toBe('metric');
  });

  it('refuses a form that names nothing, or is larger than any form', async () => {
    const empty = await send({ returnTo: '/' });
    const large = await send({ units: 'imperial', filler: 'x'.repeat(300_000) });
    for (const { taken, cookies } of [empty, large]) {
      expect(taken).toEqual({ fields: { '': 'Name at least one preference.' } });
      expect(cookies).toEqual({});
    }
  });

  it('never goes to another site', async () => {
    for (const returnTo of ['//elsewhere.test', 'https://elsewhere.test', '/\\elsewhere.test']) {
      expect((await send({ units: 'metric', returnTo })).taken).toEqual({ goTo: '/' });
    }
  });
});

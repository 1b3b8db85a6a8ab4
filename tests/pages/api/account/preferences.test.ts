import { describe, expect, it } from 'vitest';
import { PATCH } from '../../../../src/pages/api/account/preferences';
import { GET as me } from '../../../../src/pages/api/me';
import { callRoute } from '../../../support/callRoute';
import { buildUser } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

describe('PATCH /api/account/preferences', () => {
  it('is for whoever is signed in', async () => {
    const body = { units: 'imperial' };
    expect((await callRoute(PATCH, { method: 'PATCH', body })).status).toBe(401);
  });

  it('says what is wrong with each field', async () => {
    const user = await buildUser();
    await expectFieldErrors(PATCH, { method: 'PATCH', user, body: { units: 'metric' } }, [
      { change: { units: 'cubits' }, fields: { units: 'Choose metric or imperial.' } },
      { change: { terms: 'au' }, fields: { terms: 'Choose US or UK terms.' } },
      { change: { theme: 'sepia' }, fields: { theme: 'Choose system, light or dark.' } },
      {
        change: { currency: 'eur' },
        fields: { currency: 'Choose one of the listed currencies, for example EUR.' },
      },
      { change: { units: undefined }, fields: { '': 'Name at least one preference.' } },
    ]);
  });

  it('changes what is named and leaves the rest', async () => {
    const user = await buildUser();
    const body = { units: 'imperial', currency: 'GBP' };
    const expected = { units: 'imperial', terms: 'us', theme: 'system', currency: 'GBP' };
    expect((await callRoute(PATCH, { method: 'PATCH', user, body })).json).toEqual(expected);
    expect((await callRoute(me, { user })).json.preferences).toEqual(expected);
  });
});

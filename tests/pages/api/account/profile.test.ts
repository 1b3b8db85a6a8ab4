import { describe, expect, it } from 'vitest';
import { PUT } from '../../../../src/pages/api/account/profile';
import { presentAccount, presentCurrentUser } from '../../../../src/server/presenters/user';
import { accountSchema } from '../../../../src/schemas/user';
import { callRoute } from '../../../support/callRoute';
import { buildUser, buildUserRow } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

const body = { name: 'Tamsin A. Okafor', roles: ['teacher', 'maker'], version: 1 };

describe('PUT /api/account/profile', () => {
  it('is for whoever is signed in', async () => {
    expect((await callRoute(PUT, { method: 'PUT', body })).status).toBe(401);
  });

  it('says what is wrong with each field', async () => {
    const user = await buildUser();
    await expectFieldErrors(PUT, { method: 'PUT', user, body }, [
      { change: { name: '' }, fields: { name: 'Enter your name.' } },
      { change: { roles: [] }, fields: { roles: 'Choose at least one.' } },
      { change: { version: undefined }, fields: { version: 'The version is missing.' } },
    ]);
  });

  it('changes name and roles, and raises the version', async () => {
    const row = await buildUserRow();
    const { status, json } = await callRoute(PUT, {
      method: 'PUT',
      user: presentCurrentUser(row),
      body,
    });
    expect(status).toBe(200);
    expect(json).toMatchObject({ name: body.name, roles: ['maker', 'teacher'], version: 2 });
    await row.reload({ include: 'roleRows' });
    expect(accountSchema.parse(presentAccount(row))).toEqual(json);
  });

  it('neither gives nor takes the role of administrator', async () => {
    const administrator = await buildUser({ roles: ['administrator', 'maker'] });
    const kept = await callRoute(PUT, { method: 'PUT', user: administrator, body });
    const given = await callRoute(PUT, {
      method: 'PUT',
      user: await buildUser(),
      body: { ...body, roles: ['administrator'] },
    });
    expect(kept.json.roles).toEqual(['maker', 'teacher', 'administrator']);
    expect(given.status).toBe(400);
  });

  it('tells a later save what the account is now, and changes nothing', async () => {
    const row = await buildUserRow();
    const user = presentCurrentUser(row);
    await callRoute(PUT, { method: 'PUT', user, body });
    const late = await callRoute(PUT, { method: 'PUT', user, body: { ...body, name: 'Late' } });
    expect(late.status).toBe(409);
    expect(late.json.error).toMatchObject({
      code: 'conflict',
      message: 'Your account was changed elsewhere in the meantime.',
      current: { name: body.name, version: 2 },
    });
    expect((await row.reload()).name).toBe(body.name);
  });

  it('lets one of two saves at once win', async () => {
    const user = await buildUser();
    const save = (name: string) => callRoute(PUT, { method: 'PUT', user, body: { ...body, name } });
    const both = await Promise.all([save('One'), save('Two')]);
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
  });
});

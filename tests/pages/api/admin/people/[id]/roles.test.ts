import { randomUUID } from 'node:crypto';
import { beforeEach, describe, expect, it } from 'vitest';
import { AuditEntry } from '../../../../../../db/models';
import { GET as audit } from '../../../../../../src/pages/api/admin/audit';
import { PUT } from '../../../../../../src/pages/api/admin/people/[id]/roles';
import { WORKING_ROLES } from '../../../../../../src/schemas/roles';
import type { CurrentUser } from '../../../../../../src/schemas/user';
import { callRoute } from '../../../../../support/callRoute';
import { emptyDatabase } from '../../../../../support/database';
import { buildUser } from '../../../../../support/factories';
import { expectFieldErrors } from '../../../../../support/refusals';

let administrator: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  administrator = await buildUser({ name: 'Ada', roles: ['administrator'] });
});

const set = (subject: { id: string }, roles: string[], version = 1, user = administrator) =>
  callRoute(PUT, {
    method: 'PUT',
    user,
    params: { id: subject.id },
    body: { roles, version },
  });

describe('PUT /api/admin/people/[id]/roles', () => {
  it('is for administrators alone', async () => {
    const subject = await buildUser();
    const call = {
      method: 'PUT',
      params: { id: subject.id },
      body: { roles: ['maker'], version: 1 },
    };
    expect((await callRoute(PUT, call)).status).toBe(401);
    for (const role of WORKING_ROLES) {
      const user = await buildUser({ roles: [role] });
      expect((await callRoute(PUT, { ...call, user })).status).toBe(403);
    }
  });

  it('says what is wrong with each field', async () => {
    const { id } = await buildUser();
    const call = { method: 'PUT', user: administrator, params: { id } };
    await expectFieldErrors(PUT, { ...call, body: { roles: ['maker'], version: 1 } }, [
      { change: { roles: [] }, fields: { roles: 'Choose at least one.' } },
      { change: { roles: ['maker', 'maker'] }, fields: { roles: 'Choose each role once.' } },
      { change: { version: undefined }, fields: { version: 'The version is missing.' } },
    ]);
    const { json } = await set({ id: 'someone' }, ['maker']);
    expect(json.error.fields).toEqual({ id: 'That is not the id of a person.' });
  });

  it('answers 404 for a person there is not', async () => {
    const { status, json } = await set({ id: randomUUID() }, ['maker']);
    expect([status, json.error.message]).toEqual([404, 'There is no such person.']);
  });

  it('sets the roles and writes down who did it', async () => {
    const subject = await buildUser({ name: 'Bram', roles: ['maker'] });
    const { status, json } = await set(subject, ['seller', 'administrator']);
    expect(status).toBe(200);
    expect(json).toMatchObject({ roles: ['seller', 'administrator'], version: 2 });
    const { json: list } = await callRoute(audit, { user: administrator });
    expect(list).toMatchObject({
      totalCount: 1,
      entries: [
        {
          action: 'roles-set',
          actorName: 'Ada',
          subjectName: 'Bram',
          before: ['maker'],
          after: ['seller', 'administrator'],
        },
      ],
    });
  });

  it('tells a later save what the person is now, and changes nothing', async () => {
    const subject = await buildUser();
    await set(subject, ['seller']);
    const { status, json } = await set(subject, ['teacher'], 1);
    expect(status).toBe(409);
    expect(json.error).toMatchObject({
      code: 'conflict',
      message: 'This person was changed by someone else in the meantime.',
      current: { roles: ['seller'], version: 2 },
    });
    expect(await AuditEntry.count()).toBe(1);
  });

  it('keeps the last administrator', async () => {
    const { status, json } = await set(administrator, ['maker']);
    expect(status).toBe(409);
    expect(json.error).toEqual({
      code: 'last-administrator',
      message: 'This is the last administrator. Make someone else one first.',
    });
    expect(await AuditEntry.count()).toBe(0);
  });

  it('keeps one of two administrators who remove each other at once', async () => {
    const other = await buildUser({ roles: ['administrator'] });
    const both = await Promise.all([
      set(other, ['maker'], 1, administrator),
      set(administrator, ['maker'], 1, other),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
  });
});

import { beforeEach, describe, expect, it } from 'vitest';
import { AuditEntry, EmailToken, sequelize, User, UserRole } from '../../../../db/models';
import { POST } from '../../../../src/pages/api/account/deletion';
import { issueToken } from '../../../../src/server/emailTokens';
import { presentCurrentUser } from '../../../../src/server/presenters/user';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildUser, buildUserRow, PASSWORD } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

beforeEach(emptyDatabase);
const body = { password: PASSWORD };

describe('POST /api/account/deletion', () => {
  it('is for whoever is signed in', async () => {
    expect((await callRoute(POST, { method: 'POST', body })).status).toBe(401);
  });

  it('asks for the password', async () => {
    const user = await buildUser();
    await expectFieldErrors(POST, { method: 'POST', user, body }, [
      { change: { password: '' }, fields: { password: 'Enter your password.' } },
      { change: { password: 'not mine' }, fields: { password: 'That is not your password.' } },
    ]);
    expect(await User.count()).toBe(1);
  });

  it('deletes the account with all its rows, and ends the session', async () => {
    const row = await buildUserRow();
    await sequelize.transaction((transaction) =>
      issueToken(row, 'reset', row.email, { transaction, now: new Date() }),
    );
    const user = presentCurrentUser(row);
    const { status, cookies } = await callRoute(POST, { method: 'POST', user, body });
    expect(status).toBe(204);
    expect(cookies).toEqual({ 'authjs.session-token': '' });
    expect([await User.count(), await UserRole.count(), await EmailToken.count()]).toEqual([
      0, 0, 0,
    ]);
  });

  it('keeps the last administrator', async () => {
    const last = await buildUser({ roles: ['administrator'] });
    const { status, json } = await callRoute(POST, { method: 'POST', user: last, body });
    expect(status).toBe(409);
    expect(json.error).toEqual({
      code: 'last-administrator',
      message: 'You are the last administrator. Make someone else one first.',
    });
  });

  it('leaves no name behind in the list of changes', async () => {
    const { id, name } = await buildUserRow({ name: 'Odile Marchetti' });
    const entry = { actorId: id, actorName: name, subjectId: id, subjectName: name };
    await AuditEntry.create({ action: 'roles-set', ...entry, before: [], after: [] });
    await callRoute(POST, {
      method: 'POST',
      user: { id, name, email: 'x@example.com', roles: [] },
      body,
    });
    expect(await AuditEntry.findOne()).toMatchObject({
      actorId: null,
      actorName: 'a deleted account',
      subjectId: null,
      subjectName: 'a deleted account',
    });
  });
});

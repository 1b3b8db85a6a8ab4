import { beforeEach, describe, expect, it, vi } from 'vitest';
import { PUT } from '../../../../src/pages/api/account/password';
import { GET as me } from '../../../../src/pages/api/me';
import { verifyPassword } from '../../../../src/server/passwordHash';
import { presentCurrentUser } from '../../../../src/server/presenters/user';
import { callRoute } from '../../../support/callRoute';
import { buildUser, buildUserRow, PASSWORD } from '../../../support/factories';
import { catchMail, type Mailbox } from '../../../support/mailbox';
import { expectFieldErrors } from '../../../support/refusals';
import { sessionCookieOf } from '../../../support/sessionCookieOf';

vi.mock('../../../../src/server/mail', { spy: true });
let mailbox: Mailbox;
beforeEach(() => {
  mailbox = catchMail();
});

const body = { currentPassword: PASSWORD, password: 'eighteen skeins' };

describe('PUT /api/account/password', () => {
  it('is for whoever is signed in', async () => {
    expect((await callRoute(PUT, { method: 'PUT', body })).status).toBe(401);
  });

  it('says what is wrong with each field', async () => {
    const user = await buildUser();
    await expectFieldErrors(PUT, { method: 'PUT', user, body }, [
      {
        change: { currentPassword: 'not mine' },
        fields: { currentPassword: 'That is not your password.' },
      },
      { change: { currentPassword: '' }, fields: { currentPassword: 'Enter your password.' } },
      {
        change: { password: 'skein' },
        fields: { password: 'Use at least 10 characters; this has 5.' },
      },
      {
        change: { password: `${user.email}!` },
        fields: { password: 'Choose a password that does not contain your e-mail address.' },
      },
    ]);
  });

  it('ends the other sessions and goes on with this one', async () => {
    const row = await buildUserRow();
    const other = { cookie: await sessionCookieOf(row) };
    const changed = await callRoute(PUT, {
      method: 'PUT',
      user: presentCurrentUser(row),
      body,
    });
    const [[name, value] = []] = Object.entries(changed.cookies);
    const own = { cookie: `${name}=${value}` };
    expect(changed.status).toBe(200);
    expect((await callRoute(me, { headers: other, withSession: true })).status).toBe(401);
    expect((await callRoute(me, { headers: own, withSession: true })).status).toBe(200);
    expect(await verifyPassword(body.password, (await row.reload()).passwordHash)).toBe(true);
    expect(mailbox.lettersTo(row.email)[0]?.subject).toBe('Your password was changed');
  });
});

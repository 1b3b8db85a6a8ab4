import { beforeEach, describe, expect, it, vi } from 'vitest';
import { sequelize, type User } from '../../../../db/models';
import { POST } from '../../../../src/pages/api/account/reset-password';
import { GET as me } from '../../../../src/pages/api/me';
import { issueToken } from '../../../../src/server/emailTokens';
import { verifyPassword } from '../../../../src/server/passwordHash';
import { callRoute } from '../../../support/callRoute';
import { buildUserRow, PASSWORD } from '../../../support/factories';
import { catchMail, type Mailbox } from '../../../support/mailbox';
import { expectFieldErrors } from '../../../support/refusals';
import { sessionCookieOf } from '../../../support/sessionCookieOf';

vi.mock('../../../../src/server/mail', { spy: true });
let mailbox: Mailbox;
beforeEach(() => {
  mailbox = catchMail();
});

const NEW_PASSWORD = 'eighteen skeins';
const issue = (user: User, now = new Date()) =>
  sequelize.transaction((transaction) =>
    issueToken(user, 'reset', user.email, { transaction, now }),
  );
const reset = (token: string, password = NEW_PASSWORD) =>
  callRoute(POST, { method: 'POST', body: { token, password } });

describe('POST /api/account/reset-password', () => {
  it('says what is wrong with each field', async () => {
    const token = 'A'.repeat(43);
    await expectFieldErrors(POST, { method: 'POST', body: { token, password: NEW_PASSWORD } }, [
      { change: { token: undefined }, fields: { token: 'The link is not complete.' } },
      {
        change: { password: 'short' },
        fields: { password: 'Use at least 10 characters; this has 5.' },
      },
    ]);
  });

  it('sets the new password and tells the owner', async () => {
    const user = await buildUserRow();
    const { status, json } = await reset(await issue(user));
    expect([status, json]).toEqual([200, { email: user.email }]);
    await user.reload();
    expect(await verifyPassword(NEW_PASSWORD, user.passwordHash)).toBe(true);
    expect(await verifyPassword(PASSWORD, user.passwordHash)).toBe(false);
    expect(mailbox.lettersTo(user.email)[0]?.subject).toBe('Your password was changed');
  });

  it('ends every session that was open', async () => {
    const user = await buildUserRow();
    const headers = { cookie: await sessionCookieOf(user) };
    const before = await callRoute(me, { headers, withSession: true });
    await reset(await issue(user));
    const after = await callRoute(me, { headers, withSession: true });
    expect([before.status, after.status]).toEqual([200, 401]);
  });

  it('confirms the address, since the letter reached it', async () => {
    const user = await buildUserRow({ isConfirmed: false });
    await reset(await issue(user));
    expect((await user.reload()).emailConfirmedAt).not.toBeNull();
  });

  it('works once, and for an hour', async () => {
    const user = await buildUserRow();
    const token = await issue(user);
    const first = await reset(token);
    const second = await reset(token, 'nineteen skeins');
    const old = await reset(await issue(user, new Date(Date.now() - 3_600_000)));
    expect([first.status, second.status, old.status]).toEqual([200, 410, 410]);
    expect(await verifyPassword(NEW_PASSWORD, (await user.reload()).passwordHash)).toBe(true);
  });

  it('is still usable after a password that does not do', async () => {
    const user = await buildUserRow();
    const token = await issue(user);
    const refused = await reset(token, `my ${user.email}`);
    expect(refused.json.error.fields).toEqual({
      password: 'Choose a password that does not contain your e-mail address.',
    });
    expect((await reset(token)).status).toBe(200);
  });

  it('takes the place of a link sent earlier', async () => {
    const user = await buildUserRow();
    const first = await issue(user);
    await issue(user);
    expect((await reset(first)).status).toBe(410);
  });
});

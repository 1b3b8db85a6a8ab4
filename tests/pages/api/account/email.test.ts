import { beforeEach, describe, expect, it, vi } from 'vitest';
import { EmailToken } from '../../../../db/models';
import { PUT } from '../../../../src/pages/api/account/email';
import { POST as confirm } from '../../../../src/pages/api/account/confirm';
import { presentCurrentUser } from '../../../../src/server/presenters/user';
import { callRoute } from '../../../support/callRoute';
import { buildUser, buildUserRow, PASSWORD } from '../../../support/factories';
import { catchMail, type Mailbox } from '../../../support/mailbox';
import { expectFieldErrors } from '../../../support/refusals';

vi.mock('../../../../src/server/mail', { spy: true });
let mailbox: Mailbox;
let email: string;
let count = 0;
beforeEach(() => {
  mailbox = catchMail();
  count += 1;
  email = `new${count}@example.com`;
});

describe('PUT /api/account/email', () => {
  it('is for whoever is signed in', async () => {
    const body = { email, password: PASSWORD };
    expect((await callRoute(PUT, { method: 'PUT', body })).status).toBe(401);
  });

  it('says what is wrong with each field', async () => {
    const user = await buildUser();
    await expectFieldErrors(PUT, { method: 'PUT', user, body: { email, password: PASSWORD } }, [
      {
        change: { email: 'new' },
        fields: { email: 'Enter an address like name@example.com.' },
      },
      { change: { email: user.email }, fields: { email: 'This is your address already.' } },
      { change: { password: '' }, fields: { password: 'Enter your password.' } },
      { change: { password: 'not mine' }, fields: { password: 'That is not your password.' } },
    ]);
    expect(mailbox.letters).toEqual([]);
  });

  it('keeps the old address until the link sent to the new one is followed', async () => {
    const row = await buildUserRow();
    const old = row.email;
    const { status, json } = await callRoute(PUT, {
      method: 'PUT',
      user: presentCurrentUser(row),
      body: { email, password: PASSWORD },
    });
    expect([status, json]).toEqual([200, { isMailSent: true }]);
    expect(await row.reload()).toMatchObject({ email: old, pendingEmail: email });
    expect(mailbox.lettersTo(old)[0]?.subject).toBe('Your e-mail address is being changed');

    await callRoute(confirm, { method: 'POST', body: { token: mailbox.tokenTo(email) } });
    expect(await row.reload()).toMatchObject({ email, pendingEmail: null });
  });

  it('tells the owner of a taken address, not the caller', async () => {
    await buildUserRow({ email });
    const user = await buildUser();
    const { status, json } = await callRoute(PUT, {
      method: 'PUT',
      user,
      body: { email, password: PASSWORD },
    });
    expect([status, json]).toEqual([200, { isMailSent: true }]);
    expect(mailbox.lettersTo(email).map(({ subject }) => subject)).toEqual([
      'This address already has an account',
    ]);
    expect(await EmailToken.count({ where: { email } })).toBe(1);
  });

  it('counts wrong passwords', async () => {
    const user = await buildUser();
    const statuses = [];
    // 10 tries in 15 minutes: src/server/rateLimit.ts.
    for (let call = 0; call < 11; call += 1) {
      const body = { email, password: 'not mine' };
      statuses.push((await callRoute(PUT, { method: 'PUT', user, body })).status);
    }
    expect(statuses.slice(-2)).toEqual([400, 429]);
  });
});

import { beforeEach, describe, expect, it, vi } from 'vitest';
import { AuditEntry, sequelize, User } from '../../../../db/models';
import { POST } from '../../../../src/pages/api/account/confirm';
import { issueToken } from '../../../../src/server/emailTokens';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildUserRow } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

const ISSUED = new Date('2026-12-01T10:00:00Z');
const HOUR_MS = 3_600_000;

beforeEach(async () => {
  await emptyDatabase();
  vi.useRealTimers();
  vi.unstubAllEnvs();
});

const issue = (user: User, email = user.email, purpose: 'confirm' | 'reset' = 'confirm') =>
  sequelize.transaction((transaction) =>
    issueToken(user, purpose, email, { transaction, now: ISSUED }),
  );
async function confirm(token: string, hoursLater = 1) {
  const now = new Date(ISSUED.getTime() + hoursLater * HOUR_MS);
  vi.useFakeTimers({ now, toFake: ['Date'] });
  const answer = await callRoute(POST, { method: 'POST', body: { token } });
  vi.useRealTimers();
  return answer;
}
const GONE = {
  code: 'gone',
  message: 'This link was used already, or is too old. Ask for a new one.',
};

describe('POST /api/account/confirm', () => {
  it('refuses what cannot be a token', async () => {
    await expectFieldErrors(POST, { method: 'POST', body: {} }, [
      { change: {}, fields: { token: 'The link is not complete.' } },
      {
        change: { token: 'short' },
        fields: { token: 'The link is not complete. Copy all of it from the letter.' },
      },
    ]);
  });

  it('confirms the address, and answers it for the sign-in form', async () => {
    const user = await buildUserRow({ isConfirmed: false });
    const { status, json } = await confirm(await issue(user));
    expect([status, json]).toEqual([200, { email: user.email }]);
    expect((await user.reload()).emailConfirmedAt).not.toBeNull();
  });

  it('works once', async () => {
    const token = await issue(await buildUserRow({ isConfirmed: false }));
    expect((await confirm(token)).status).toBe(200);
    const again = await confirm(token);
    expect([again.status, again.json.error]).toEqual([410, GONE]);
  });

  it('works once also when followed twice at the same moment', async () => {
    const token = await issue(await buildUserRow({ isConfirmed: false }));
    vi.useFakeTimers({ now: ISSUED, toFake: ['Date'] });
    const call = () => callRoute(POST, { method: 'POST', body: { token } });
    const both = await Promise.all([call(), call()]);
    vi.useRealTimers();
    expect(both.map(({ status }) => status).sort()).toEqual([200, 410]);
  });

  it('works for 24 hours', async () => {
    const early = await issue(await buildUserRow({ isConfirmed: false }));
    const late = await issue(await buildUserRow({ isConfirmed: false }));
    expect((await confirm(early, 23.99)).status).toBe(200);
    expect((await confirm(late, 24)).status).toBe(410);
  });

  it('takes no token of another kind, and none that nobody was sent', async () => {
    const user = await buildUserRow({ isConfirmed: false });
    expect((await confirm(await issue(user, user.email, 'reset'))).status).toBe(410);
    expect((await confirm('A'.repeat(43))).status).toBe(410);
    expect((await user.reload()).emailConfirmedAt).toBeNull();
  });

  it('gives a confirmed account its new address', async () => {
    const user = await buildUserRow();
    await user.update({ pendingEmail: 'new@example.com' });
    await confirm(await issue(user, 'new@example.com'));
    expect(await user.reload()).toMatchObject({ email: 'new@example.com', pendingEmail: null });
  });

  it('does not give an address that another account confirmed in the meantime', async () => {
    const user = await buildUserRow({ email: 'first@example.com' });
    const token = await issue(user, 'wanted@example.com');
    await buildUserRow({ email: 'wanted@example.com' });
    const { status, json } = await confirm(token);
    expect(status).toBe(409);
    expect(json.error.message).toBe('Another account has this address by now.');
    expect((await user.reload()).email).toBe('first@example.com');
  });

  it('gives an address that another account only claimed, and drops that claim', async () => {
    const user = await buildUserRow();
    const claim = await buildUserRow({ email: 'wanted@example.com', isConfirmed: false });
    expect((await confirm(await issue(user, 'wanted@example.com'))).status).toBe(200);
    expect(await User.findByPk(claim.id)).toBeNull();
  });

  it('makes the named address the first administrator, once, and writes it down', async () => {
    vi.stubEnv('ADMINISTRATOR_EMAIL', 'Owner@Example.com');
    const owner = await buildUserRow({ email: 'owner@example.com', isConfirmed: false });
    await confirm(await issue(owner));
    const roles = (await owner.reload({ include: 'roleRows' })).roleRows?.map(({ role }) => role);
    expect(roles?.sort()).toEqual(['administrator', 'maker']);
    expect(await AuditEntry.findOne()).toMatchObject({
      action: 'first-administrator',
      subjectId: owner.id,
      before: ['maker'],
      after: ['maker', 'administrator'],
    });
  });

  it('makes nobody administrator where there is one already', async () => {
    vi.stubEnv('ADMINISTRATOR_EMAIL', 'owner@example.com');
    await buildUserRow({ roles: ['administrator'] });
    const late = await buildUserRow({ email: 'owner@example.com', isConfirmed: false });
    await confirm(await issue(late));
    expect((await late.reload({ include: 'roleRows' })).roleRows).toHaveLength(1);
  });
});

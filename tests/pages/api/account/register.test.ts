import { beforeEach, describe, expect, it, vi } from 'vitest';
import { EmailToken, User } from '../../../../db/models';
import { POST } from '../../../../src/pages/api/account/register';
import { callRoute } from '../../../support/callRoute';
import { buildUserRow } from '../../../support/factories';
import { emptyDatabase } from '../../../support/database';
import { catchMail, type Mailbox } from '../../../support/mailbox';
import { expectFieldErrors } from '../../../support/refusals';

vi.mock('../../../../src/server/mail', { spy: true });
let mailbox: Mailbox;
let count = 0;
beforeEach(async () => {
  await emptyDatabase();
  // Another address each time: letters to one are limited.
  count += 1;
  odile.email = `odile${count}@example.com`;
  mailbox = catchMail();
});

const odile = {
  name: 'Odile Marchetti',
  email: 'odile@example.com',
  password: 'seventeen skeins',
  roles: ['maker', 'designer'],
};
const register = (body: object, clientAddress?: string) =>
  callRoute(POST, { method: 'POST', body, clientAddress, url: '/api/account/register' });
const accounts = () => User.findAll({ include: 'roleRows' });

describe('POST /api/account/register', () => {
  it('says what is wrong with each field, in words', async () => {
    await expectFieldErrors(POST, { method: 'POST', body: odile }, [
      { change: { name: undefined }, fields: { name: 'Enter your name.' } },
      { change: { name: '   ' }, fields: { name: 'Enter your name.' } },
      { change: { name: 'x'.repeat(81) }, fields: { name: 'Use at most 80 characters.' } },
      {
        change: { name: 'Odile\nMarchetti' },
        fields: { name: 'Leave out line breaks and control characters.' },
      },
      { change: { email: undefined }, fields: { email: 'Enter your e-mail address.' } },
      { change: { email: ' ' }, fields: { email: 'Enter your e-mail address.' } },
      {
        change: { email: 'odile@example' },
        fields: { email: 'Enter an address like name@example.com.' },
      },
      {
        change: { email: `${'x'.repeat(250)}@example.com` },
        fields: { email: 'An e-mail address has at most 254 characters.' },
      },
      { change: { password: undefined }, fields: { password: 'Choose a password.' } },
      { change: { password: '' }, fields: { password: 'Choose a password.' } },
      {
        change: { password: 'skeins' },
        fields: { password: 'Use at least 10 characters; this has 6.' },
      },
      {
        change: { password: 'x1'.repeat(65) },
        fields: { password: 'Use at most 128 characters.' },
      },
      {
        change: { password: 'aabbaabbaabb' },
        fields: { password: 'Use at least 4 different characters.' },
      },
      {
        change: { password: 'my ODILE1@example.com' },
        fields: { password: 'Choose a password that does not contain your e-mail address.' },
      },
      { change: { roles: [] }, fields: { roles: 'Choose at least one.' } },
      { change: { roles: ['maker', 'maker'] }, fields: { roles: 'Choose each role once.' } },
      { change: { roles: undefined }, fields: { roles: 'Choose from the listed roles.' } },
    ]);
    expect(await User.count()).toBe(0);
  });

  it('gives nobody the role of administrator', async () => {
    const { status } = await register({ ...odile, roles: ['maker', 'administrator'] });
    expect(status).toBe(400);
    expect(await User.count()).toBe(0);
  });

  it('makes an account to be confirmed, with its roles and an argon2id hash', async () => {
    const { status, json } = await register(odile);
    expect(status).toBe(201);
    expect(json).toEqual({ isMailSent: true });
    const [user] = await accounts();
    expect(user).toMatchObject({ name: odile.name, email: odile.email, emailConfirmedAt: null });
    expect(user?.roleRows?.map(({ role }) => role).sort()).toEqual(['designer', 'maker']);
    expect(user?.passwordHash).toMatch(/^\$argon2id\$/);
  });

  it('sends a link whose token is stored only as a hash, for 24 hours', async () => {
    vi.useFakeTimers({ now: new Date('2026-12-01T10:00:00Z'), toFake: ['Date'] });
    await register(odile);
    vi.useRealTimers();
    const token = mailbox.tokenTo(odile.email);
    const stored = await EmailToken.findOne({ rejectOnEmpty: true });
    expect(mailbox.letters[0]?.link?.url).toBe(`http://ellwise.test/confirm?token=${token}`);
    expect(JSON.stringify(stored)).not.toContain(token);
    expect(stored.tokenHash).toMatch(/^[0-9a-f]{64}$/);
    expect(stored.expiresAt.toISOString()).toBe('2026-12-02T10:00:00.000Z');
  });

  it('writes an address one way, however it was typed', async () => {
    await register({ ...odile, email: ` ${odile.email.toUpperCase()} ` });
    expect((await accounts())[0]?.email).toBe(odile.email);
  });

  it('answers the same for an address that has an account, and tells its owner instead', async () => {
    const owner = await buildUserRow({ name: 'Odile', email: odile.email });
    const { status, json } = await register({ ...odile, email: odile.email.toUpperCase() });
    expect([status, json]).toEqual([201, { isMailSent: true }]);
    expect(mailbox.letters.map(({ subject }) => subject)).toEqual(['You already have an account']);
    expect((await accounts())[0]).toMatchObject({
      name: 'Odile',
      passwordHash: owner.passwordHash,
    });
  });

  it('lets an unconfirmed registration be made again: the last one counts, with its link', async () => {
    await register(odile);
    const first = mailbox.tokenTo(odile.email);
    await register({ ...odile, name: 'Odile M.', roles: ['teacher'] });
    const [user, ...others] = await accounts();
    expect(others).toEqual([]);
    expect(user?.name).toBe('Odile M.');
    expect(user?.roleRows?.map(({ role }) => role)).toEqual(['teacher']);
    expect(mailbox.tokenTo(odile.email)).not.toBe(first);
    expect(await EmailToken.count()).toBe(1);
  });

  it('ends in one account when two register at once', async () => {
    const both = await Promise.all([
      register(odile),
      register({ ...odile, email: odile.email.toUpperCase() }),
    ]);
    expect(both.map(({ status }) => status)).toEqual([201, 201]);
    expect(await User.count()).toBe(1);
    expect(await EmailToken.count()).toBe(1);
  });

  it('keeps the account when the letter could not be sent, and says so', async () => {
    mailbox.breakDown();
    const { status, json } = await register(odile);
    expect([status, json]).toEqual([201, { isMailSent: false }]);
    expect(await User.count()).toBe(1);
  });

  it('sends at most five letters an hour to one address', async () => {
    const email = 'many@example.com';
    for (let call = 0; call < 5; call += 1) await register({ ...odile, email });
    const { status, headers } = await register({ ...odile, email });
    expect(status).toBe(429);
    expect(Number(headers.get('retry-after'))).toBeGreaterThan(0);
    expect(mailbox.lettersTo(email)).toHaveLength(5);
  });
});

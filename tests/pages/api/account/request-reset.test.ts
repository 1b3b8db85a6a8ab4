import { beforeEach, describe, expect, it, vi } from 'vitest';
import { EmailToken } from '../../../../db/models';
import { POST } from '../../../../src/pages/api/account/request-reset';
import { backgroundDone } from '../../../../src/server/background';
import { callRoute } from '../../../support/callRoute';
import { buildUserRow } from '../../../support/factories';
import { catchMail, type Mailbox } from '../../../support/mailbox';
import { expectFieldErrors } from '../../../support/refusals';

vi.mock('../../../../src/server/mail', { spy: true });
let mailbox: Mailbox;
beforeEach(() => {
  mailbox = catchMail();
});

const ask = (email: string) => callRoute(POST, { method: 'POST', body: { email } });

describe('POST /api/account/request-reset', () => {
  it('refuses what is not an address', async () => {
    await expectFieldErrors(POST, { method: 'POST', body: { email: '' } }, [
      { change: {}, fields: { email: 'Enter your e-mail address.' } },
    ]);
  });

  it('sends a link that works for one hour', async () => {
    const user = await buildUserRow();
    vi.useFakeTimers({ now: new Date('2026-12-01T10:00:00Z'), toFake: ['Date'] });
    await ask(user.email.toUpperCase());
    await backgroundDone();
    vi.useRealTimers();
    const token = mailbox.tokenTo(user.email);
    expect(mailbox.letters[0]?.link?.url).toBe(`http://ellwise.test/reset/${token}`);
    const stored = await EmailToken.findOne({ where: { userId: user.id }, rejectOnEmpty: true });
    expect(stored.expiresAt.toISOString()).toBe('2026-12-01T11:00:00.000Z');
  });

  it('answers a known and an unknown address alike, before anything was looked up', async () => {
    const { email } = await buildUserRow();
    const known = await ask(email);
    const sentBeforeTheAnswer = mailbox.letters.length;
    const unknown = await ask('nobody@example.com');
    await backgroundDone();
    expect(known).toEqual({ ...unknown, headers: known.headers });
    expect(known.json).toEqual({ isAccepted: true });
    expect(sentBeforeTheAnswer).toBe(0);
    expect(mailbox.lettersTo('nobody@example.com')).toEqual([]);
  });

  it('counts letters to unknown addresses too, so that the limit tells nothing', async () => {
    const statuses = [];
    for (let call = 0; call < 6; call += 1) statuses.push((await ask('no-one@example.com')).status);
    await backgroundDone();
    expect(statuses).toEqual([200, 200, 200, 200, 200, 429]);
  });
});

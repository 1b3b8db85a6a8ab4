import { beforeEach, describe, expect, it, vi } from 'vitest';
import { POST } from '../../../../src/pages/api/account/resend-confirmation';
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

async function resend(email: string) {
  const answer = await callRoute(POST, { method: 'POST', body: { email } });
  await backgroundDone();
  return answer;
}

describe('POST /api/account/resend-confirmation', () => {
  it('refuses what is not an address', async () => {
    await expectFieldErrors(POST, { method: 'POST', body: { email: 'a@b' } }, [
      { change: {}, fields: { email: 'Enter an address like name@example.com.' } },
    ]);
  });

  it('sends the letter again to whoever still has to confirm', async () => {
    const { email } = await buildUserRow({ isConfirmed: false });
    const { status, json } = await resend(email);
    expect([status, json]).toEqual([200, { isAccepted: true }]);
    expect(mailbox.tokenTo(email)).toMatch(/^[\w-]{43}$/);
  });

  it('answers the same, and sends nothing, to a confirmed or an unknown address', async () => {
    const { email } = await buildUserRow();
    for (const address of [email, 'nobody@example.com']) {
      const { status, json } = await resend(address);
      expect([status, json]).toEqual([200, { isAccepted: true }]);
    }
    expect(mailbox.letters).toEqual([]);
  });
});

import type { SignInRefusal } from '../../../schemas/account';
import { Notice } from '../../ui/Notice';
import { ResendLetter } from './ResendLetter';

const WORDS: Record<SignInRefusal, string> = {
  wrong: 'E-mail and password do not belong together. Check both, or choose a new password.',
  unconfirmed:
    'This address is still to be confirmed. Follow the link in the letter we sent to it.',
  'too-many': 'Too many tries. Wait a quarter of an hour, or choose a new password.',
  failed: 'Signing in did not work. Try again.',
};

/** Why a sign-in was refused, and what helps. */
export function SignInRefused({ why, email }: { why: SignInRefusal; email?: string }) {
  const isUnconfirmed = why === 'unconfirmed';
  const resend = email ? (
    <ResendLetter email={email} />
  ) : (
    <a className="link" href="/confirm">
      Send the letter again
    </a>
  );
  return (
    <Notice kind={isUnconfirmed ? 'question' : 'problem'} live action={isUnconfirmed && resend}>
      {WORDS[why]}
    </Notice>
  );
}

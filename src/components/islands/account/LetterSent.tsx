import { Notice } from '../../ui/Notice';
import { ResendLetter } from './ResendLetter';

interface LetterSentProps {
  email: string;
  /** False when the mail server did not take the letter. */
  isMailSent: boolean;
}

/** After registering: where the letter went, and how to get another. */
export function LetterSent({ email, isMailSent }: LetterSentProps) {
  const resend = <ResendLetter email={email} />;
  return isMailSent ? (
    <Notice live title="Look into your mail" action={resend}>
      A letter is on its way to <b>{email}</b>. Follow its link within 24 hours, then sign in.
    </Notice>
  ) : (
    <Notice kind="question" live title="The letter did not leave" action={resend}>
      Your account is kept, but the letter to <b>{email}</b> could not be sent. Ask for it again in
      a few minutes.
    </Notice>
  );
}

import { post } from '../../../client/api';
import { acceptedSchema, emailOnlySchema } from '../../../schemas/account';
import { Field } from '../../ui/Field';
import { Notice } from '../../ui/Notice';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { useAccountForm } from './useAccountForm';

const JOBS = {
  confirm: {
    address: '/api/account/resend-confirmation',
    submitWord: 'Send the letter again',
    done: 'If an account with this address waits to be confirmed, a letter is on its way. If none comes within a few minutes, ask again.',
  },
  reset: {
    address: '/api/account/request-reset',
    submitWord: 'Send me a link',
    done: 'If this address has an account, a letter with a link is on its way; the link works for one hour. If none comes within a few minutes, ask again.',
  },
} as const;

/** Asks for a letter. The answer is the same for every address, so that it tells nothing. */
export function AskForLetter({ job }: { job: keyof typeof JOBS }) {
  return (
    <WithQueries>
      <Form {...JOBS[job]} />
    </WithQueries>
  );
}

function Form({ address, submitWord, done }: (typeof JOBS)[keyof typeof JOBS]) {
  const account = useAccountForm({
    schema: emailOnlySchema,
    defaultValues: { email: '' },
    send: (values) => post(address, values, acceptedSchema),
  });
  return (
    <AccountForm
      onSubmit={account.submit}
      submitWord={submitWord}
      busyWord="Sending…"
      isBusy={account.isBusy}
      failure={account.failure}
    >
      <Field
        label="E-mail"
        type="email"
        inputMode="email"
        autoComplete="email"
        {...account.field('email')}
      />
      {account.sent && (
        <Notice live title="Look into your mail">
          {done}
        </Notice>
      )}
    </AccountForm>
  );
}

import { put } from '../../../client/api';
import { changeEmailSchema, letterSchema } from '../../../schemas/account';
import { Field } from '../../ui/Field';
import { Notice } from '../../ui/Notice';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { PasswordField } from './PasswordField';
import { useAccountForm } from './useAccountForm';

interface EmailFormProps {
  email: string;
  pendingEmail: string | null;
}

export function EmailForm(props: EmailFormProps) {
  return (
    <WithQueries>
      <Form {...props} />
    </WithQueries>
  );
}

function Form({ email, pendingEmail }: EmailFormProps) {
  const account = useAccountForm({
    schema: changeEmailSchema,
    defaultValues: { email: '', password: '' },
    send: (values) => put('/api/account/email', values, letterSchema),
    onSent: () => account.form.reset({ email: '', password: '' }),
  });
  const waiting = account.sent?.email ?? pendingEmail;
  const hasFailed = account.result?.isMailSent === false;
  return (
    <AccountForm
      onSubmit={account.submit}
      submitWord="Change the address"
      busyWord="Sending the letter…"
      kind="plain"
      isBusy={account.isBusy}
      failure={account.failure}
    >
      <p>
        Your address is <b>{email}</b>.
      </p>
      {waiting && (
        <Notice kind={hasFailed ? 'question' : 'note'} live={account.sent !== null}>
          {hasFailed ? (
            <>
              The letter to <b>{waiting}</b> could not be sent. Try again in a few minutes.
            </>
          ) : (
            <>
              <b>{waiting}</b> is to be confirmed: follow the link in the letter sent to it. Until
              then the old address counts.
            </>
          )}
        </Notice>
      )}
      <Field
        label="New e-mail"
        type="email"
        inputMode="email"
        autoComplete="email"
        {...account.field('email')}
      />
      <PasswordField
        label="Your password"
        autoComplete="current-password"
        {...account.field('password')}
        id="email-password"
      />
    </AccountForm>
  );
}

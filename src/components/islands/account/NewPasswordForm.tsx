import { post } from '../../../client/api';
import { ownerSchema, resetPasswordSchema } from '../../../schemas/account';
import { PASSWORD_MIN_LENGTH } from '../../../schemas/user';
import { ButtonLink } from '../../ui/Button';
import { Notice } from '../../ui/Notice';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { PasswordField } from './PasswordField';
import { useAccountForm } from './useAccountForm';

/** Chooses a new password by the link of a letter. */
export function NewPasswordForm({ token }: { token: string }) {
  return (
    <WithQueries>
      <Form token={token} />
    </WithQueries>
  );
}

function Form({ token }: { token: string }) {
  const account = useAccountForm({
    schema: resetPasswordSchema,
    defaultValues: { token, password: '' },
    send: (values) => post('/api/account/reset-password', values, ownerSchema),
  });
  if (account.result) {
    const email = encodeURIComponent(account.result.email);
    return (
      <Notice
        live
        title="Your password is changed"
        action={
          <ButtonLink kind="primary" href={`/sign-in?email=${email}`}>
            Sign in
          </ButtonLink>
        }
      >
        Every session of the account was ended. Sign in with the new password.
      </Notice>
    );
  }
  return (
    <AccountForm
      onSubmit={account.submit}
      submitWord="Change the password"
      busyWord="Changing…"
      isBusy={account.isBusy}
      failure={account.failure}
    >
      <PasswordField
        label="New password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_MIN_LENGTH} characters. Three or four words are easy to keep.`}
        {...account.field('password')}
      />
    </AccountForm>
  );
}

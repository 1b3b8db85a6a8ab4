import { put } from '../../../client/api';
import { changePasswordSchema, ownerSchema } from '../../../schemas/account';
import { PASSWORD_MIN_LENGTH } from '../../../schemas/user';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { PasswordField } from './PasswordField';
import { useAccountForm } from './useAccountForm';

export function PasswordForm() {
  return (
    <WithQueries>
      <Form />
    </WithQueries>
  );
}

function Form() {
  const account = useAccountForm({
    schema: changePasswordSchema,
    defaultValues: { currentPassword: '', password: '' },
    send: (values) => put('/api/account/password', values, ownerSchema),
    onSent: () => account.form.reset(),
  });
  return (
    <AccountForm
      onSubmit={account.submit}
      submitWord="Change the password"
      busyWord="Changing…"
      kind="plain"
      isBusy={account.isBusy}
      failure={account.failure}
      beside={<p role="status">{account.sent && 'Changed. Your other sessions were ended.'}</p>}
    >
      <PasswordField
        label="Password now"
        autoComplete="current-password"
        {...account.field('currentPassword')}
      />
      <PasswordField
        label="New password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_MIN_LENGTH} characters.`}
        {...account.field('password')}
      />
    </AccountForm>
  );
}

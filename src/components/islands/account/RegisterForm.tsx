import { post } from '../../../client/api';
import { letterSchema, registerSchema } from '../../../schemas/account';
import { WORKING_ROLES } from '../../../schemas/roles';
import { PASSWORD_MIN_LENGTH } from '../../../schemas/user';
import { Field } from '../../ui/Field';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { LetterSent } from './LetterSent';
import { PasswordField } from './PasswordField';
import { RolesField } from './RolesField';
import { useAccountForm } from './useAccountForm';

export function RegisterForm() {
  return (
    <WithQueries>
      <Form />
    </WithQueries>
  );
}

function Form() {
  const account = useAccountForm({
    schema: registerSchema,
    defaultValues: { name: '', email: '', password: '', roles: ['maker'] },
    send: (values) => post('/api/account/register', values, letterSchema),
  });
  if (account.sent) {
    return (
      <LetterSent email={account.sent.email} isMailSent={account.result?.isMailSent ?? false} />
    );
  }
  return (
    <AccountForm
      onSubmit={account.submit}
      submitWord="Register"
      busyWord="Registering…"
      isBusy={account.isBusy}
      failure={account.failure}
    >
      <Field label="Name" autoComplete="name" {...account.field('name')} />
      <Field
        label="E-mail"
        type="email"
        inputMode="email"
        autoComplete="email"
        hint="We send one letter to it, to confirm that it is yours."
        {...account.field('email')}
      />
      <PasswordField
        label="Password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_MIN_LENGTH} characters. Three or four words are easy to keep.`}
        {...account.field('password')}
      />
      <RolesField
        legend="I work as"
        roles={WORKING_ROLES}
        registration={account.form.register('roles')}
        error={account.errorOf('roles')}
      />
    </AccountForm>
  );
}

import { signIn } from '../../../client/signIn';
import { signInSchema, type SignInRefusal } from '../../../schemas/account';
import { Field } from '../../ui/Field';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { PasswordField } from './PasswordField';
import { SignInRefused } from './SignInRefused';
import { useAccountForm } from './useAccountForm';

interface SignInFormProps {
  csrfToken: string;
  /** A path of this site. */
  returnTo: string;
  email?: string;
  /** Why a sign-in sent without script was refused. */
  refusal: SignInRefusal | null;
}

export function SignInForm(props: SignInFormProps) {
  return (
    <WithQueries>
      <Form {...props} />
    </WithQueries>
  );
}

/** Works as a plain form too: the fields and the address are those Auth.js takes. */
function Form({ csrfToken, returnTo, email = '', refusal }: SignInFormProps) {
  const account = useAccountForm({
    schema: signInSchema,
    defaultValues: { email, password: '' },
    send: (values) => signIn(values, { csrfToken, callbackUrl: returnTo }),
    onSent(refused) {
      if (refused) account.form.setFocus('password');
      else window.location.assign(returnTo);
    },
  });
  const isDone = account.sent !== null && account.result === null;
  const shown = account.sent ? account.result : account.isBusy ? null : refusal;
  return (
    <AccountForm
      action="/api/auth/callback/credentials"
      onSubmit={account.submit}
      submitWord="Sign in"
      busyWord="Signing in…"
      isBusy={account.isBusy || isDone}
      failure={account.failure}
      beside={
        <a className="link" href="/reset">
          Forgotten the password?
        </a>
      }
    >
      <input type="hidden" name="csrfToken" value={csrfToken} />
      <input type="hidden" name="callbackUrl" value={returnTo} />
      {shown && <SignInRefused why={shown} email={account.sent?.email} />}
      <Field
        label="E-mail"
        type="email"
        inputMode="email"
        autoComplete="username"
        {...account.field('email')}
      />
      <PasswordField
        label="Password"
        autoComplete="current-password"
        {...account.field('password')}
      />
    </AccountForm>
  );
}

import { put } from '../../../client/api';
import { profileSchema } from '../../../schemas/account';
import { WORKING_ROLES, type WorkingRole } from '../../../schemas/roles';
import { accountSchema, type Account } from '../../../schemas/user';
import { Button } from '../../ui/Button';
import { Field } from '../../ui/Field';
import { Notice } from '../../ui/Notice';
import { conflictOf } from '../form/formErrors';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { RolesField } from './RolesField';
import { useAccountForm } from './useAccountForm';

export function ProfileForm({ account }: { account: Account }) {
  return (
    <WithQueries>
      <Form row={account} />
    </WithQueries>
  );
}

const formValues = ({ name, roles, version }: Account) => ({
  name,
  roles: roles.filter((role): role is WorkingRole => role !== 'administrator'),
  version,
});

function Form({ row }: { row: Account }) {
  const account = useAccountForm({
    schema: profileSchema,
    defaultValues: formValues(row),
    send: (values) => put('/api/account/profile', values, accountSchema),
    // The page's header shows the name; the form goes on from the saved version.
    onSent: (saved) => account.form.reset(formValues(saved)),
  });
  const current = conflictOf<Account>(account.error);
  return (
    <AccountForm
      onSubmit={account.submit}
      submitWord="Save"
      busyWord="Saving…"
      isBusy={account.isBusy}
      failure={current ? null : account.failure}
      beside={<p role="status">{account.sent && !account.form.formState.isDirty && 'Saved.'}</p>}
    >
      <Field label="Name" autoComplete="name" {...account.field('name')} />
      <RolesField
        legend="I work as"
        roles={WORKING_ROLES}
        registration={account.form.register('roles')}
        error={account.errorOf('roles')}
      />
      {current && (
        <Notice
          kind="question"
          live
          title="Changed elsewhere in the meantime"
          action={
            <>
              <Button
                small
                onClick={() => {
                  account.form.setValue('version', current.version);
                  void account.submit();
                }}
              >
                Keep what I typed
              </Button>
              <Button
                small
                onClick={() => {
                  account.form.reset(formValues(current));
                  account.reset();
                }}
              >
                Take the other
              </Button>
            </>
          }
        >
          There the name is <b>{current.name}</b>, working as {formValues(current).roles.join(', ')}
          .
        </Notice>
      )}
    </AccountForm>
  );
}

import { put } from '../../../../client/api';
import { personSchema, rolesChangeSchema, type Person } from '../../../../schemas/people';
import { ROLES } from '../../../../schemas/roles';
import { Button } from '../../../ui/Button';
import { Notice } from '../../../ui/Notice';
import { conflictOf } from '../../form/formErrors';
import { WithQueries } from '../../WithQueries';
import { AccountForm } from '../AccountForm';
import { RolesField } from '../RolesField';
import { useAccountForm } from '../useAccountForm';

export function RolesForm({ person }: { person: Person }) {
  return (
    <WithQueries>
      <Form person={person} />
    </WithQueries>
  );
}

const formValues = ({ roles, version }: Person) => ({ roles, version });

function Form({ person }: { person: Person }) {
  const account = useAccountForm({
    schema: rolesChangeSchema,
    defaultValues: formValues(person),
    send: (values) => put(`/api/admin/people/${person.id}/roles`, values, personSchema),
    onSent: (saved) => account.form.reset(formValues(saved)),
  });
  const current = conflictOf<Person>(account.error);
  return (
    <AccountForm
      onSubmit={account.submit}
      submitWord="Save the roles"
      busyWord="Saving…"
      isBusy={account.isBusy}
      failure={current ? null : account.failure}
      beside={<p role="status">{account.sent && !account.form.formState.isDirty && 'Saved.'}</p>}
    >
      <RolesField
        legend="Roles"
        roles={ROLES}
        registration={account.form.register('roles')}
        error={account.errorOf('roles')}
      />
      {current && (
        <Notice
          kind="question"
          live
          title="Changed by someone else in the meantime"
          action={
            <Button
              small
              onClick={() => {
                account.form.reset(formValues(current));
                account.reset();
              }}
            >
              Show what it is now
            </Button>
          }
        >
          {person.name} now works as {current.roles.join(', ')}.
        </Notice>
      )}
    </AccountForm>
  );
}

import { useState } from 'react';
import { post } from '../../../client/api';
import { deleteAccountSchema } from '../../../schemas/account';
import { nothingSchema } from '../../../schemas/schema';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { WithQueries } from '../WithQueries';
import { AccountForm } from './AccountForm';
import { PasswordField } from './PasswordField';
import { useAccountForm } from './useAccountForm';

export function DeleteAccountForm() {
  const [isOpen, setOpen] = useState(false);
  return (
    <WithQueries>
      <Button kind="destructive" onClick={() => setOpen(true)}>
        Delete the account…
      </Button>
      <Dialog
        open={isOpen}
        onOpenChange={setOpen}
        title="Delete the account?"
        description="Your swatches, motifs, blankets, stash and lists go with it, at once and for good."
      >
        <Form />
      </Dialog>
    </WithQueries>
  );
}

function Form() {
  const account = useAccountForm({
    schema: deleteAccountSchema,
    defaultValues: { password: '' },
    send: (values) => post('/api/account/deletion', values, nothingSchema),
    onSent: () => window.location.assign('/'),
  });
  return (
    <div className="pb-3">
      <AccountForm
        onSubmit={account.submit}
        submitWord="Delete for good"
        busyWord="Deleting…"
        kind="destructive"
        isBusy={account.isBusy || account.sent !== null}
        failure={account.failure}
      >
        <PasswordField
          label="Your password"
          autoComplete="current-password"
          {...account.field('password')}
          id="delete-password"
        />
      </AccountForm>
    </div>
  );
}

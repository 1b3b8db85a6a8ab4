import { useMutation } from '@tanstack/react-query';
import { useState, type FormEvent } from 'react';
import { post } from '../../client/api';
import type { Plan } from '../../lib/plan/plan';
import { blanketSchema } from '../../schemas/blanket';
import { KEPT_LIMITS } from '../../schemas/limits';
import { WithQueries } from '../islands/WithQueries';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';

interface KeepBlanketProps {
  plan: Plan;
  onClose: () => void;
}

/** Names the plan on the front page and keeps it in the account. */
export default function KeepBlanket(props: KeepBlanketProps) {
  return (
    <WithQueries>
      <KeepDialog {...props} />
    </WithQueries>
  );
}

function KeepDialog({ plan, onClose }: KeepBlanketProps) {
  const [title, setTitle] = useState(plan.motifs[0] ? `${plan.motifs[0].name} blanket` : 'Blanket');
  const { mutate, isPending, error } = useMutation({
    mutationFn: () => post('/api/blankets', { title, plan }, blanketSchema),
    onSuccess: ({ id }) => window.location.assign(`/blankets/${id}`),
  });
  function submit(event: FormEvent) {
    event.preventDefault();
    mutate();
  }
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title="Keep this blanket"
      description="It is saved from then on, as you change it, on every device you sign in on."
    >
      <form onSubmit={submit} className="grid gap-4 pb-4">
        <Field
          label="Title"
          data-own-undo
          value={title}
          maxLength={KEPT_LIMITS.titleLength}
          onChange={(event) => setTitle(event.target.value)}
          error={error?.message}
          required
        />
        <Button
          kind="primary"
          type="submit"
          busy={isPending && 'Saving…'}
          className="justify-self-start"
        >
          Keep it
        </Button>
      </form>
    </Dialog>
  );
}

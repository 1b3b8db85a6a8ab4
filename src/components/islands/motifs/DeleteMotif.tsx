import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { Trash2 } from 'lucide-react';
import { deleteMotif } from '../../../client/queries/motifs';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { Notice } from '../../ui/Notice';
import { failureWords } from '../form/formErrors';

interface DeleteMotifProps {
  motifKey: string;
  name: string;
  onDeleted: () => void;
}

/** Asks before a motif goes with all its versions, and says what stays. */
export function DeleteMotif({ motifKey, name, onDeleted }: DeleteMotifProps) {
  const [isAsking, setAsking] = useState(false);
  const deleting = useMutation({
    mutationFn: () => deleteMotif(motifKey),
    onSuccess: onDeleted,
  });
  return (
    <>
      <Button kind="quiet" icon={Trash2} onClick={() => setAsking(true)}>
        Delete
      </Button>
      <Dialog
        open={isAsking}
        onOpenChange={setAsking}
        title={`Delete “${name}”?`}
        description="It goes with all its versions and what you measured of it. Blankets planned with it keep its rounds."
        actions={
          <>
            <Button
              kind="destructive"
              busy={deleting.isPending && 'Deleting…'}
              onClick={() => deleting.mutate()}
            >
              Delete the motif
            </Button>
            <Button onClick={() => setAsking(false)}>Keep it</Button>
          </>
        }
      >
        {deleting.error && (
          <Notice kind="problem" live>
            {failureWords(deleting.error)}
          </Notice>
        )}
      </Dialog>
    </>
  );
}

import { useMutation } from '@tanstack/react-query';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { Notice } from '../../ui/Notice';
import { failureWords } from '../form/formErrors';
import { showDay } from '../swatches/swatchWords';
import type { KeptMade } from './keptMade';

interface DeleteMadeProps {
  kept: KeptMade;
  remove: (kept: KeptMade) => Promise<void>;
  onClose: () => void;
}

/** Asks before measurements go, and says what stays. */
export function DeleteMade({ kept, remove, onClose }: DeleteMadeProps) {
  const deleting = useMutation({ mutationFn: () => remove(kept), onSuccess: onClose });
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Delete what you measured on ${showDay(kept.madeOn)}?`}
      description="Blankets planned with it keep its size and weight."
      actions={
        <>
          <Button
            kind="destructive"
            busy={deleting.isPending && 'Deleting…'}
            onClick={() => deleting.mutate()}
          >
            Delete it
          </Button>
          <Button onClick={onClose}>Keep it</Button>
        </>
      }
    >
      {deleting.error && (
        <Notice kind="problem" live>
          {failureWords(deleting.error)}
        </Notice>
      )}
    </Dialog>
  );
}

import { useMutation } from '@tanstack/react-query';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { Notice } from '../../ui/Notice';
import { failureWords } from '../form/formErrors';
import type { KeptStitch } from './keptStitch';

interface DeleteStitchProps {
  kept: KeptStitch;
  /** The text that is open uses it. */
  isUsed: boolean;
  remove: (kept: KeptStitch) => Promise<void>;
  onClose: () => void;
}

/** Asks before a stitch goes, and says what stays. */
export function DeleteStitch({ kept, isUsed, remove, onClose }: DeleteStitchProps) {
  const deleting = useMutation({ mutationFn: () => remove(kept), onSuccess: onClose });
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Delete “${kept.abbreviation}, ${kept.name}”?`}
      description={
        isUsed
          ? 'The text that is open uses it and will not be read without it. Motifs and blankets kept with it keep theirs.'
          : 'Motifs and blankets kept with it keep theirs.'
      }
      actions={
        <>
          <Button
            kind="destructive"
            busy={deleting.isPending && 'Deleting…'}
            onClick={() => deleting.mutate()}
          >
            Delete the stitch
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

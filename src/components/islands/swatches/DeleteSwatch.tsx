import { useMutation } from '@tanstack/react-query';
import { Trash2 } from 'lucide-react';
import { useState } from 'react';
import { createSwatch, deleteSwatch, swatchContent } from '../../../client/queries/swatches';
import type { PresentedSwatch } from '../../../schemas/swatch';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { failureWords } from '../form/formErrors';

/** Deletes at once, and then offers to take it back or to go on. */
export function DeleteSwatch({ swatch }: { swatch: PresentedSwatch }) {
  const [isDeleted, setDeleted] = useState(false);
  const deleting = useMutation({
    mutationFn: () => deleteSwatch(swatch.id),
    onSuccess: () => setDeleted(true),
  });
  const undoing = useMutation({
    mutationFn: () => createSwatch(swatchContent(swatch)),
    onSuccess: ({ id }) => window.location.replace(`/swatches/${id}`),
  });
  const failure = deleting.error ?? undoing.error;
  const goOn = () => window.location.replace('/swatches');
  return (
    <div className="border-t border-line pt-3">
      <Button
        kind="quiet"
        icon={Trash2}
        className="-ms-2 text-madder"
        busy={deleting.isPending && 'Deleting…'}
        onClick={() => deleting.mutate()}
      >
        Delete swatch
      </Button>
      {failure && <p className="text-sm text-madder">{failureWords(failure)}</p>}
      <Dialog
        open={isDeleted}
        onOpenChange={(open) => !open && goOn()}
        title={`“${swatch.name}” is deleted`}
        description="Blankets planned with it keep its figures."
        actions={
          <>
            <Button kind="primary" onClick={goOn}>
              Back to the swatches
            </Button>
            <Button
              busy={undoing.isPending && 'Bringing it back…'}
              onClick={() => undoing.mutate()}
            >
              Undo
            </Button>
          </>
        }
      />
    </div>
  );
}

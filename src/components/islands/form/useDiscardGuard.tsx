import { useState, type ReactNode } from 'react';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';

interface DiscardGuard {
  /** Closes at once, or asks first when something was typed. */
  requestClose: () => void;
  /** The question, while it is asked. */
  question: ReactNode;
}

/** A panel with typing in it is not closed by a slip of the finger. */
export function useDiscardGuard(isDirty: boolean, onClose: () => void): DiscardGuard {
  const [isAsking, setAsking] = useState(false);
  return {
    requestClose: () => (isDirty ? setAsking(true) : onClose()),
    question: (
      <Dialog
        open={isAsking}
        onOpenChange={setAsking}
        title="Leave without saving?"
        description="What you typed here is not kept yet."
        actions={
          <>
            <Button kind="primary" onClick={() => setAsking(false)}>
              Go on typing
            </Button>
            <Button onClick={onClose}>Leave it</Button>
          </>
        }
      />
    ),
  };
}

import { Button } from '../../ui/Button';
import { Notice } from '../../ui/Notice';
import { failureWords } from './formErrors';

interface StaleNoticeProps {
  /** Why the rows could not be asked for again; nothing while they could. */
  error: Error | null;
  onRetry: () => void;
}

/** What is on the screen could not be brought up to date; it stays, and says so. */
export function StaleNotice({ error, onRetry }: StaleNoticeProps) {
  if (!error) return null;
  return (
    <Notice
      kind="problem"
      live
      className="mb-4"
      action={<Button onClick={onRetry}>Try again</Button>}
    >
      {failureWords(error)} What is shown may be old.
    </Notice>
  );
}

import { Suspense, type ReactNode } from 'react';
import { ErrorBoundary } from 'react-error-boundary';
import { Button } from './Button';
import { Notice } from './Notice';

interface LoadedLaterProps {
  /** What it is, for the notice: "The chart". */
  what: string;
  fallback?: ReactNode;
  children: ReactNode;
}

/** Something whose code is fetched when asked for. Should that fail, the rest of the page stays. */
export function LoadedLater({ what, fallback, children }: LoadedLaterProps) {
  return (
    <ErrorBoundary fallback={<NotLoaded what={what} />}>
      <Suspense fallback={fallback}>{children}</Suspense>
    </ErrorBoundary>
  );
}

/** Only the page loaded anew tries a failed import again. */
function NotLoaded({ what }: { what: string }) {
  return (
    <Notice
      kind="problem"
      live
      action={
        <Button small onClick={() => window.location.reload()}>
          Load the page again
        </Button>
      }
    >
      {what} could not be loaded. What you entered is kept.
    </Notice>
  );
}

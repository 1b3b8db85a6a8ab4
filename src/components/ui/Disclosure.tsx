import { ChevronRight } from 'lucide-react';
import type { ReactNode } from 'react';
import { classNames } from './classNames';

interface DisclosureProps {
  /** "How this is worked out" */
  summary: ReactNode;
  children: ReactNode;
  open?: boolean;
  /** Told when it opens and closes. */
  onToggle?: (isOpen: boolean) => void;
  className?: string;
}

/** The browser's own details: works without script, and find-in-page opens it. */
export function Disclosure({ summary, children, open, onToggle, className }: DisclosureProps) {
  return (
    <details
      className={classNames('group', className)}
      open={open}
      onToggle={(event) => onToggle?.(event.currentTarget.open)}
    >
      <summary className="-ms-1 inline-flex min-h-8 list-none items-center gap-1 rounded-control px-1 font-bold text-teal coarse:min-h-11 [&::-webkit-details-marker]:hidden">
        <ChevronRight
          size={16}
          aria-hidden
          className="shrink-0 transition-transform group-open:rotate-90"
        />
        <span className="underline-offset-3 hover:underline">{summary}</span>
      </summary>
      <div className="ms-[7px] mt-1 border-s border-line ps-4">{children}</div>
    </details>
  );
}

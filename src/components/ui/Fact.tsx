import type { ReactNode } from 'react';
import { classNames } from './classNames';

interface FactProps {
  /** A line above: what the answer is an answer to. */
  lead?: ReactNode;
  /** The largest thing on the page: "18 skeins". */
  answer: ReactNode;
  /** How sure, and why. */
  children?: ReactNode;
  /** Reads the answer out whenever it changes. */
  live?: boolean;
  className?: string;
}

export function Fact({ lead, answer, children, live, className }: FactProps) {
  return (
    <div className={className}>
      {lead && <p className="text-ink-2">{lead}</p>}
      <p
        className={classNames('text-answer font-bold tabular-nums', !!lead && 'mt-1')}
        aria-live={live ? 'polite' : undefined}
        aria-atomic={live ? true : undefined}
      >
        {answer}
      </p>
      {children && <div className="mt-2 text-ink-2">{children}</div>}
    </div>
  );
}

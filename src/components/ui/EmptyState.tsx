import type { ReactNode } from 'react';

interface EmptyStateProps {
  /** One sentence: what will be here. */
  children: ReactNode;
  /** The one act that begins it. */
  action: ReactNode;
  /** An example to load or look at. */
  example?: ReactNode;
  /** A drawing of our own, if it teaches. */
  drawing?: ReactNode;
}

export function EmptyState({ children, action, example, drawing }: EmptyStateProps) {
  return (
    <div className="flex flex-wrap items-center gap-6 rounded-control border border-dashed border-edge px-6 py-8">
      {drawing}
      <div>
        <p className="max-w-[56ch] text-lg">{children}</p>
        <div className="mt-4 flex flex-wrap items-center gap-x-5 gap-y-3">
          {action}
          {example}
        </div>
      </div>
    </div>
  );
}

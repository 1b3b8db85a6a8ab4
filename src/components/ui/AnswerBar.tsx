import type { ReactNode } from 'react';

interface AnswerBarProps {
  /** "18 skeins" */
  answer: ReactNode;
  /** "95 % sure · 118 × 147 cm" */
  detail?: ReactNode;
  /** One button at most: it is a thumb's width. */
  action?: ReactNode;
}

/** On a phone the answer stays in view at the foot of the screen; on a desktop it is in view anyway. */
export function AnswerBar({ answer, detail, action }: AnswerBarProps) {
  return (
    <div data-chrome className="answer-bar">
      <div className="min-w-0 flex-1">
        <p className="text-xl font-bold tabular-nums">{answer}</p>
        {detail && <p className="truncate text-sm text-ink-2">{detail}</p>}
      </div>
      {action}
    </div>
  );
}

import { CircleHelp, Info, TriangleAlert, type LucideIcon } from 'lucide-react';
import type { ReactNode } from 'react';
import { classNames } from './classNames';

type NoticeKind = 'note' | 'question' | 'problem';

const looks: Record<NoticeKind, { icon: LucideIcon; word: string; frame: string; ink: string }> = {
  note: { icon: Info, word: 'Note', frame: 'border-teal', ink: 'text-teal' },
  question: {
    icon: CircleHelp,
    word: 'Please check',
    frame: 'border-amber bg-amber-soft',
    ink: 'text-amber-ink',
  },
  problem: {
    icon: TriangleAlert,
    word: 'Problem',
    frame: 'border-madder bg-madder-soft',
    ink: 'text-madder',
  },
};

interface NoticeProps {
  kind?: NoticeKind;
  /** Takes the place of the kind's own word. */
  title?: string;
  children: ReactNode;
  action?: ReactNode;
  /** Read out at once when it appears. */
  live?: boolean;
  className?: string;
}

export function Notice({ kind = 'note', title, children, action, live, className }: NoticeProps) {
  const { icon: Icon, word, frame, ink } = looks[kind];
  return (
    <div
      role={live ? (kind === 'problem' ? 'alert' : 'status') : undefined}
      className={classNames('border-s-4 py-2 ps-3 pe-3', frame, className)}
    >
      <p className={classNames('flex items-center gap-1.5 text-sm font-bold', ink)}>
        <Icon size={16} aria-hidden className="shrink-0" />
        {title ?? word}
      </p>
      <div className="mt-1">{children}</div>
      {action && <div className="mt-2 flex flex-wrap gap-2">{action}</div>}
    </div>
  );
}

import { Check, CircleAlert, LoaderCircle } from 'lucide-react';
import { classNames } from './classNames';

export type SaveState =
  | { is: 'saved'; at?: string }
  | { is: 'saving' }
  | { is: 'unsaved' }
  | { is: 'failed'; why: string };

/** Saving is automatic, and says so in one quiet line. */
export function SaveStatus({ state, className }: { state: SaveState; className?: string }) {
  return (
    <p
      role="status"
      className={classNames(
        'inline-flex items-center gap-1.5 text-sm',
        state.is === 'failed' ? 'font-bold text-madder' : 'text-ink-2',
        className,
      )}
    >
      {state.is === 'saved' && <Check size={15} aria-hidden />}
      {state.is === 'saving' && <LoaderCircle size={15} aria-hidden className="animate-spin" />}
      {state.is === 'failed' && <CircleAlert size={15} aria-hidden className="shrink-0" />}
      {saveWords(state)}
    </p>
  );
}

export function saveWords(state: SaveState): string {
  if (state.is === 'saved') return state.at ? `Saved ${state.at}` : 'Saved';
  if (state.is === 'saving') return 'Saving…';
  if (state.is === 'unsaved') return 'Not saved yet';
  return `Not saved: ${state.why}`;
}

import { Check, CloudOff, LoaderCircle } from 'lucide-react';
import type { SendState } from './useMaking';

/** Where the marks are: on every device, or so far on this one. */
export function SendWords({ state, unsent }: { state: SendState; unsent: number }) {
  const held = `${unsent} ${unsent === 1 ? 'mark is' : 'marks are'} kept on this device`;
  return (
    <p role="status" className="inline-flex items-center gap-1.5 text-sm text-ink-2">
      {state.is === 'refused' ? (
        <span className="font-bold text-madder">
          {unsent > 0 && `${held}: `}
          {state.why}
        </span>
      ) : unsent === 0 ? (
        <>
          <Check size={15} aria-hidden /> Saved
          {state.is === 'offline' && ', no connection'}
        </>
      ) : state.is === 'offline' ? (
        <>
          <CloudOff size={15} aria-hidden /> {held} and sent when there is a connection
        </>
      ) : (
        <>
          <LoaderCircle size={15} aria-hidden className="animate-spin" /> Saving…
        </>
      )}
    </p>
  );
}

import type { JoinText } from '../../lib/joins/joinTexts';
import { Disclosure } from '../ui/Disclosure';

/** A join written out: its row or rounds, and what changes on sides that link. */
export function JoinPattern({ pattern }: { pattern: JoinText }) {
  return (
    <Disclosure summary="Written out">
      <p className="text-sm text-ink-2">
        {pattern.worked === 'seam'
          ? 'One row along the edge nearer to you; “facing” is the other motif. Where none is named, through both edges.'
          : 'On every motif, beginning in the first stitch after a corner.'}
      </p>
      <p className="mt-1 font-mono text-sm whitespace-pre-line">{pattern.text}</p>
      {pattern.linked && (
        <>
          <p className="mt-2 text-sm text-ink-2">On sides that link, the last round is:</p>
          <p className="mt-1 font-mono text-sm">{pattern.linked}</p>
        </>
      )}
    </Disclosure>
  );
}

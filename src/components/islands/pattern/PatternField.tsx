import { memo, useMemo, type KeyboardEvent, type PointerEvent, type Ref } from 'react';
import type { Diagnostic, Severity } from '../../../lib/pattern/diagnostic';
import type { Span } from '../../../lib/pattern/span';
import { classNames } from '../../ui/classNames';
import { textPieces, type TextPiece } from './textPieces';

interface PatternFieldProps {
  text: string;
  /** The text that the problems are of: the same, or that of a moment ago. */
  readText: string;
  /** None where the text is only looked at. */
  onText: ((text: string) => void) | null;
  onKeyDown: (event: KeyboardEvent) => void;
  problems: readonly Diagnostic[];
  instructions: readonly Span[];
  /** The stretch that the chart points at. */
  lit: Span | null;
  /** Where the cursor or the mouse is, or null. */
  onOffset: (offset: number | null) => void;
  fieldRef: Ref<HTMLTextAreaElement>;
  describedBy: string;
}

/** What both layers must share, to the pixel. */
const TYPE =
  'w-full py-2.5 pe-3 ps-11 font-mono text-base leading-6 whitespace-pre-wrap wrap-anywhere';

const UNDERLINE: Readonly<Record<Severity, string>> = {
  error: 'underline decoration-wavy decoration-madder decoration-[1.5px] underline-offset-3',
  warning: 'underline decoration-dashed decoration-amber-ink decoration-2 underline-offset-4',
  note: 'underline decoration-dotted decoration-teal decoration-2 underline-offset-4',
};

/**
 * The pattern as typed, in a plain text field over a drawing of the same text that carries the
 * underlines, so that typing, selecting and undoing are the browser's own.
 */
export function PatternField(props: PatternFieldProps) {
  const { text, readText, onText, onKeyDown, problems, instructions, lit, onOffset } = props;
  const { fieldRef, describedBy } = props;

  function onPointerMove(event: PointerEvent) {
    if (event.pointerType !== 'mouse') return;
    const under = document.elementsFromPoint?.(event.clientX, event.clientY) ?? [];
    const piece = under.find((element) => element instanceof HTMLElement && element.dataset.begin);
    onOffset(piece ? Number((piece as HTMLElement).dataset.begin) : null);
  }

  return (
    <div className="max-h-[50svh] overflow-y-auto rounded-control border border-edge bg-surface focus-within:outline-2 focus-within:outline-offset-1 focus-within:outline-teal lg:max-h-[min(70vh,44rem)]">
      <div className="relative grid min-h-72">
        <Underlines text={readText} {...{ problems, instructions, lit }} />
        <textarea
          ref={fieldRef}
          aria-label="Pattern text"
          aria-describedby={describedBy}
          value={text}
          readOnly={onText === null}
          onChange={(event) => onText?.(event.target.value)}
          onKeyDown={onKeyDown}
          onSelect={(event) => onOffset(event.currentTarget.selectionStart)}
          onPointerMove={onPointerMove}
          onPointerLeave={() => onOffset(null)}
          spellCheck={false}
          autoCapitalize="off"
          autoCorrect="off"
          placeholder="Paste or type the rounds here."
          className={classNames(
            TYPE,
            'absolute inset-0 resize-none overflow-hidden bg-transparent text-ink outline-none',
          )}
        />
      </div>
    </div>
  );
}

type UnderlinesProps = Pick<PatternFieldProps, 'text' | 'problems' | 'instructions' | 'lit'>;

/** The drawing beneath. */
const Underlines = memo(({ text, problems, instructions, lit }: UnderlinesProps) => {
  const lines = useMemo(
    () => textPieces(text, problems, lit, instructions),
    [text, problems, lit, instructions],
  );
  return (
    <div aria-hidden className={classNames(TYPE, 'text-transparent [counter-reset:line]')}>
      {lines.map((pieces, i) => (
        <Line key={i} pieces={pieces} text={text} isLast={i === lines.length - 1} />
      ))}
    </div>
  );
});
Underlines.displayName = 'Underlines';

interface LineProps {
  pieces: readonly TextPiece[];
  text: string;
  isLast: boolean;
}

/** One line of the drawing beneath; an empty one keeps its height. */
const Line = memo(
  ({ pieces, text, isLast }: LineProps) => (
    <div className="relative min-h-6 [counter-increment:line] before:absolute before:end-full before:me-3 before:text-sm before:leading-6 before:text-ink-2 before:content-[counter(line)]">
      {pieces.map(({ begin, end, severity, isLit }) => (
        <span
          key={begin}
          data-begin={begin}
          className={classNames(
            severity && UNDERLINE[severity],
            isLit && 'rounded-fine bg-amber/45 outline outline-1 outline-amber',
          )}
        >
          {text.slice(begin, end)}
        </span>
      ))}
      {isLast && '\u200b'}
    </div>
  ),
  (before, after) =>
    before.isLast === after.isLast &&
    before.pieces.length === after.pieces.length &&
    before.pieces.every((piece, i) => {
      const other = after.pieces[i];
      return (
        other?.begin === piece.begin &&
        other.end === piece.end &&
        other.severity === piece.severity &&
        other.isLit === piece.isLit &&
        after.text.slice(other.begin, other.end) === before.text.slice(piece.begin, piece.end)
      );
    }),
);
Line.displayName = 'Line';

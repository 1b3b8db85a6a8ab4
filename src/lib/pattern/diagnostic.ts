import type { Span } from './span';

export type Severity = 'error' | 'warning' | 'note';

/**
 * What can be wrong with a pattern.
 * Of the work: unworked (stitches left over), repeat-uneven, no-such-place (no such space or stitch),
 * count-note (the bracketed count disagrees), turning-chain (too short or tall for what it stands for),
 * corner-count (not as many corners as sides), side-count (sides differ), round-open (does not close),
 * repeat-endless (a repeat that uses up nothing).
 * Of the words: unknown-word (no such abbreviation), terms-doubtful (US or UK), comment (left out, though it looks
 * like an instruction).
 * Of the writing: unclosed-bracket, stray-bracket, repeat-without-star, star-without-repeat, not-understood,
 * no-rounds, round-order (numbers out of order), repeated-round (a round to repeat is missing), no-ring.
 * Of the size: limit.
 */
export type DiagnosticCode =
  | 'unworked'
  | 'repeat-uneven'
  | 'no-such-place'
  | 'count-note'
  | 'turning-chain'
  | 'corner-count'
  | 'side-count'
  | 'round-open'
  | 'repeat-endless'
  | 'unknown-word'
  | 'terms-doubtful'
  | 'comment'
  | 'unclosed-bracket'
  | 'stray-bracket'
  | 'repeat-without-star'
  | 'star-without-repeat'
  | 'not-understood'
  | 'no-rounds'
  | 'round-order'
  | 'repeated-round'
  | 'no-ring'
  | 'limit';

/** A change of the text that may put it right: put `replacement` in place of what stands there. */
export interface Fix extends Span {
  /** What the button says: `Write "hdc"`. */
  readonly label: string;
  readonly replacement: string;
}

/** One thing to say about a stretch of the text. */
export interface Diagnostic extends Span {
  readonly code: DiagnosticCode;
  /** error: cannot be worked as written; warning: can, but is probably not meant; note: worth knowing. */
  readonly severity: Severity;
  /** Line and column of `begin`, counted from 1. */
  readonly line: number;
  readonly column: number;
  readonly message: string;
  readonly fix?: Fix;
}

import type { Span } from './span';

/**
 * word: letters, or a stitch written in one such as "sc2tog"; number; ordinal: "2nd", "second";
 * mark: one character of punctuation, or "**"; line: an end of line.
 */
export type TokenKind = 'word' | 'number' | 'ordinal' | 'mark' | 'line' | 'end';

export interface Token extends Span {
  readonly kind: TokenKind;
  /** In small letters and plain typography. */
  readonly text: string;
  /** As written, in plain typography. */
  readonly written: string;
  /** Of a number or ordinal, else 0. */
  readonly value: number;
  /** Whether anything but another token stands before it. */
  readonly spaceBefore: boolean;
}

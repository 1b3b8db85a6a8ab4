import type { MotifSides } from '../motif';

/** A motif as the program's own written pattern, in US terms. */
export interface ReadyPattern {
  /** Stable address. */
  readonly key: string;
  readonly name: string;
  readonly sides: MotifSides;
  /** What it is, in a sentence. */
  readonly about: string;
  readonly text: string;
}

/** What one reading takes on; beyond each there is a diagnostic and the rest is left alone. */
export const PATTERN_LIMITS = {
  /** Characters of text. A motif of 40 rounds, written out, takes about 12,000. */
  textLength: 50_000,
  /** Words, numbers and marks. */
  tokens: 25_000,
  rounds: 100,
  /** Brackets and repeats inside one another. */
  nesting: 12,
  /** The largest number that a pattern may write. */
  amount: 2_000,
  /** Sizes of "10 (12, 14)". */
  sizes: 20,
  /** Stitches made in all rounds together. */
  stitches: 60_000,
  /** Instructions carried out and places looked at, in all rounds together. */
  workSteps: 600_000,
  /** Problems told; a text with more of them is not a pattern. */
  diagnostics: 200,
  /** Tokens that are looked at as one sentence. */
  sentence: 400,
  /** Figures of one count note. */
  countEntries: 40,
} as const;

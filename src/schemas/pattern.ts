import * as z from './zod';
import { MOTIF_SIDES } from '../lib/motifs/motif';
import { PATTERN_LIMITS } from '../lib/pattern/limits';
import { choice, counted, strict } from './fields';
import { KEPT_LIMITS } from './limits';
import { ownStitches } from './ownStitch';

const inWords = new Intl.NumberFormat('en');

/** A pattern as its writer wrote it: not trimmed, so that every place in it stays where it is. */
export const patternText = z
  .string({
    error: (issue) =>
      issue.input == null ? 'Pattern text is missing' : 'Pattern text must be text',
  })
  .max(
    PATTERN_LIMITS.textLength,
    `Pattern text must have at most ${inWords.format(PATTERN_LIMITS.textLength)} characters`,
  );

/** A pattern to read, and how. */
export const patternReadInput = strict('Pattern', {
  text: patternText,
  terms: choice('Terms', ['us', 'uk']),
  sides: choice('Sides of a motif', MOTIF_SIDES),
  /** Which of the sizes "10 (12, 14)"; 0 is the first. */
  size: counted('Size', 0, PATTERN_LIMITS.sizes - 1).default(0),
  /** Stitches of the writer's own, which the text may use. */
  stitches: ownStitches(KEPT_LIMITS.stitches).default([]),
});
export type PatternReadInput = z.input<typeof patternReadInput>;

const counts = z.record(z.string(), z.number().int());

/** A pattern as read: what every round makes, and everything there is to say about its text. */
export const patternReadingSchema = z.strictObject({
  rounds: z.array(
    z.strictObject({
      label: z.string(),
      made: counts,
      tally: counts,
      spaces: counts,
      perSide: z.number().int(),
    }),
  ),
  diagnostics: z.array(
    z.strictObject({
      code: z.string(),
      severity: z.literal(['error', 'warning', 'note']),
      line: z.number().int(),
      column: z.number().int(),
      message: z.string(),
      fix: z
        .strictObject({
          label: z.string(),
          begin: z.number().int(),
          end: z.number().int(),
          replacement: z.string(),
        })
        .optional(),
    }),
  ),
});
export type PresentedReading = z.output<typeof patternReadingSchema>;

import * as z from './zod';
import { MOTIF_SIDES } from '../lib/motifs/motif';
import { PATTERN_LIMITS } from '../lib/pattern/limits';
import { choice, counted, moment, name, strict, version } from './fields';
import { KEPT_LIMITS } from './limits';
import { ownStitches } from './ownStitch';
import { patternText } from './pattern';
import { motifSchema } from './workedMotif';

/** Characters that are on no page and in no database: a PDF leaves some behind. */
const INVISIBLE = /(?![\n\t])[\p{Cc}\p{Cs}]/gu;

/** A motif of one's own as it is written; the server works its rounds. */
const patternFields = {
  name: name('Motif name'),
  text: patternText.transform((text) => text.replaceAll('\r\n', '\n').replace(INVISIBLE, ' ')),
  terms: choice('Terms', ['us', 'uk']),
  sides: choice('Sides of a motif', MOTIF_SIDES),
  /** Which of the sizes "10 (12, 14)"; 0 is the first. */
  size: counted('Size', 0, PATTERN_LIMITS.sizes - 1),
  /** The stitches of one's own that the text uses. */
  stitches: ownStitches(KEPT_LIMITS.stitchesPerMotif),
};

export const motifInput = strict('Motif', patternFields);
export type MotifInput = z.output<typeof motifInput>;
export const motifUpdate = strict('Motif', { ...patternFields, version });

const problems = z.strictObject({ errors: z.number().int(), warnings: z.number().int() });

/**
 * A motif in a list. `motif` is null where the text has no round that can be worked, or is worked in
 * rows; a ready-made motif has no version: it belongs to the program.
 */
export const motifSummarySchema = z.strictObject({
  key: z.string(),
  readyMade: z.boolean(),
  version: version.nullable(),
  updatedAt: moment.nullable(),
  name: z.string(),
  sides: z.literal(MOTIF_SIDES),
  motif: motifSchema.nullable(),
  problems,
});
export type MotifSummary = z.output<typeof motifSummarySchema>;

/** A motif with the pattern that it is worked from. */
export const presentedMotifSchema = motifSummarySchema.extend({
  pattern: z.strictObject(patternFields),
});
export type PresentedMotif = z.output<typeof presentedMotifSchema>;

/** One save of a motif of one's own; `version` is its address. */
export const motifVersionSchema = z.strictObject({
  version,
  name: z.string(),
  savedAt: moment,
  isCurrent: z.boolean(),
  rounds: z.number().int(),
  problems,
});
export type PresentedMotifVersion = z.output<typeof motifVersionSchema>;

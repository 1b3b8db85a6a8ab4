import * as z from './zod';
import { choice, listQuery, moment, name, strict, version } from './fields';
import { KEPT_LIMITS } from './limits';
import { planSchema } from './plan';

const title = name('Title', KEPT_LIMITS.titleLength);

export const blanketInput = strict('Blanket', { title, plan: planSchema });
export type BlanketInput = z.output<typeof blanketInput>;
export const blanketUpdate = strict('Blanket', { title, plan: planSchema, version });

const blanketFields = {
  id: z.uuid(),
  version,
  title: z.string(),
  createdAt: moment,
  updatedAt: moment,
  /** When it was deleted; it can be restored. */
  deletedAt: moment.nullable(),
};

export const blanketSchema = z.strictObject({ ...blanketFields, plan: planSchema });
export type PresentedBlanket = z.input<typeof blanketSchema>;

const blanketFigures = z.strictObject({
  rows: z.number().int(),
  columns: z.number().int(),
  widthMm: z.number(),
  heightMm: z.number(),
  skeins: z.number().int(),
  meanM: z.number(),
  costMinor: z.number().int().nullable(),
});
export type BlanketFigures = z.output<typeof blanketFigures>;

/** A blanket in a list: its headline figures instead of its plan. */
export const blanketSummarySchema = z.strictObject({
  ...blanketFields,
  yarnName: z.string(),
  confidence: z.number(),
  currency: z.string().nullable(),
  colours: z.array(z.strictObject({ key: z.string(), name: z.string(), hex: z.string() })),
  /** Null when the plan was made for an older edition of the program. */
  figures: blanketFigures.nullable(),
});
export type BlanketSummary = z.output<typeof blanketSummarySchema>;

/** Which blankets a list holds: those at hand, or those deleted and not yet restored. */
export const blanketsQuery = listQuery.extend({
  deleted: choice('deleted', ['no', 'only']).default('no'),
});
export type BlanketsQuery = z.output<typeof blanketsQuery>;

/** One save of a blanket; `version` is its address. */
export const revisionSchema = z.strictObject({
  version,
  title: z.string(),
  savedAt: moment,
  isCurrent: z.boolean(),
});
export type PresentedRevision = z.output<typeof revisionSchema>;

export const revisionWithPlanSchema = revisionSchema.extend({ plan: planSchema });
export type RevisionWithPlan = z.input<typeof revisionWithPlanSchema>;

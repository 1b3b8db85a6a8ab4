import * as z from './zod';
import { READY_JOINS, readyJoin } from '../lib/joins/readyJoins';
import { list, name, strict } from './fields';
import { COMPARE_LIMITS, PLAN_LIMITS } from './limits';
import { planSchema, planSwatchSchema } from './plan';

const joinKey = name('Key of a join', PLAN_LIMITS.keyLength).refine(
  (key) => readyJoin(key) !== null,
  { error: ({ input }) => `There is no join named ${String(input)}` },
);

/** Joins tried on one plan, at its own tension or at those of other swatches. */
export const compareJoinsInput = strict('Comparison', {
  plan: planSchema,
  joins: list('Joins', joinKey, 1, COMPARE_LIMITS.joins).default(() =>
    READY_JOINS.map(({ key }) => key),
  ),
  swatches: list('Swatches', planSwatchSchema, 0, COMPARE_LIMITS.swatches).default([]),
}).superRefine(({ plan, joins, swatches }, issues) => {
  const tried = joins.length * Math.max(1, swatches.length) * plan.colourways.length;
  if (tried > COMPARE_LIMITS.tried) {
    issues.addIssue({
      code: 'custom',
      path: ['joins'],
      message: `Joins × swatches × colourways must be at most ${COMPARE_LIMITS.tried}, and are ${tried}`,
    });
  }
});

const figure = z.number();
const count = z.number().int();

const comparison = z.strictObject({
  key: z.string(),
  name: z.string(),
  joinM: figure,
  totalM: figure,
  skeins: count,
  costMinor: count.nullable(),
  seamMm: figure,
  widthMm: figure,
  heightMm: figure,
  tails: figure,
  durationS: figure,
  openness: z.literal(['closed', 'slightly open', 'open']),
  fits: z.boolean(),
  fitWords: z.string(),
});

/** For each tension its joins, in the order asked for. */
export const compareJoinsSchema = z.strictObject({
  tensions: z.array(
    z.strictObject({
      /** Number of its swatch among those sent; null is the plan's own hand. */
      swatch: count.nullable(),
      joins: z.array(comparison),
      /** Why the thriftiest is, against the next; null where no two differ. */
      why: z.string().nullable(),
    }),
  ),
});
export type PresentedComparison = z.input<typeof compareJoinsSchema>;

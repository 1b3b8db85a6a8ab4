import * as z from './zod';
import { stitch } from '../lib/stitches/stitchTable';
import { counted } from './fields';
import { PLAN_LIMITS } from './limits';

const isKnown = (code: string) => code.length <= PLAN_LIMITS.keyLength && stitch(code) !== null;
const unknown = (code: unknown) =>
  `There is no stitch “${String(code).slice(0, 20)}” in the stitch table`;

/** A stitch by its US abbreviation. */
export const knownStitch = z
  .string({ error: 'Stitch must be an abbreviation such as sc' })
  .refine(isKnown, { error: (issue) => unknown(issue.input) });

/** How often each stitch is made, at most `most` times. */
export function stitchCounts(what: string, most: number) {
  return z
    .record(z.string(), counted(what, 0, most), { error: `${what} must be counts by stitch` })
    .superRefine((counts, context) => {
      const codes = Object.keys(counts);
      if (codes.length > PLAN_LIMITS.stitchKinds) {
        context.addIssue(`${what} must be of at most ${PLAN_LIMITS.stitchKinds} kinds of stitch`);
        return;
      }
      for (const code of codes) {
        if (!isKnown(code))
          context.addIssue({ code: 'custom', path: [code], message: unknown(code) });
      }
    });
}

import * as z from './zod';
import { strict, uuid } from './fields';
import { lotInput } from './stash';
import { colourwayInput, yarnInput } from './yarn';

/** What the forms of the stash hold; each part is what its own route takes. */
const lot = lotInput.omit({ colourwayId: true });
const colour = colourwayInput.omit({ yarnId: true });
export type LotContent = z.output<typeof lot>;
export type ColourContent = z.output<typeof colour>;

export const lotFormSchema = strict('Form', { lot });
export type LotForm = z.output<typeof lotFormSchema>;
export const yarnFormSchema = strict('Form', { yarn: yarnInput });
export type YarnForm = z.output<typeof yarnFormSchema>;
export const colourFormSchema = strict('Form', { colour });
export type ColourForm = z.output<typeof colourFormSchema>;

const kept = z.union([z.literal(''), uuid]);

/** A new lot; its yarn and its colour are kept ones, or made on the way. */
export const stashEntrySchema = strict('Form', {
  /** Empty while `yarn` is a new one. */
  yarnId: kept,
  yarn: yarnInput.nullable(),
  /** Empty while `colour` is a new one. */
  colourwayId: kept,
  colour: colour.nullable(),
  lot,
});
export type StashEntry = z.output<typeof stashEntrySchema>;

import * as z from './zod';
import { OWN_STITCH_LIMITS, SYMBOL_BODIES } from '../lib/stitches/ownStitch';
import { choice, counted, list, listOf, measured, moment, name, strict, version } from './fields';

const { abbreviation, wraps, draws, throughs, takes, legs, bars, heightOverWidth } =
  OWN_STITCH_LIMITS;

const ownStitchFields = {
  abbreviation: name('Abbreviation', abbreviation).regex(
    /^[a-z]{2,}$/,
    'Abbreviation must be two or more small letters, such as lst',
  ),
  name: name('Name of the stitch'),
  moves: strict('Moves', {
    wraps: counted('Wraps', 0, wraps),
    draws: counted('Draws', 0, draws),
    throughs: counted('Throughs', 0, throughs),
  }).refine(({ draws, throughs }) => draws + throughs > 0, {
    error: 'A stitch needs at least one draw or one through',
    path: ['throughs'],
  }),
  heightOverWidth: measured('Height', 'widths', heightOverWidth.most, heightOverWidth.least)
    .multipleOf(0.0001, 'Height must have at most 4 decimals')
    .nullable(),
  takes: counted('Stitches taken up', 0, takes),
  symbol: strict('Symbol', {
    body: choice('Symbol', SYMBOL_BODIES),
    legs: counted('Stems', 1, legs),
    bars: counted('Strokes', 0, bars),
  }).nullable(),
};

/** A stitch of one's own by its moves; the library's `OwnStitch`. */
export const ownStitchInput = strict('Stitch', ownStitchFields);
export type OwnStitchInput = z.output<typeof ownStitchInput>;

/** The stitches of one's own that a text may use, at most `most`, each under an abbreviation of its own. */
export const ownStitches = (most: number) =>
  list('Own stitches', ownStitchInput, 0, most).refine(
    (stitches) => new Set(stitches.map((each) => each.abbreviation)).size === stitches.length,
    'Own stitches must each have an abbreviation of their own',
  );

/** What the form of a stitch holds; its fields' ids begin with "stitch". */
export const ownStitchForm = strict('Form', { stitch: ownStitchInput });
export type OwnStitchForm = z.output<typeof ownStitchForm>;
export const ownStitchUpdate = strict('Stitch', { ...ownStitchFields, version });

export const presentedOwnStitchSchema = z.strictObject({
  id: z.uuid(),
  version,
  updatedAt: moment,
  ...ownStitchFields,
});
export type PresentedOwnStitch = z.output<typeof presentedOwnStitchSchema>;
export const ownStitchListSchema = listOf(presentedOwnStitchSchema);

import * as z from './zod';
import { choice, counted, name, notes, strict } from './fields';
import { PLAN_LIMITS } from './limits';
import { knownStitch, stitchCounts } from './stitchCounts';
import { roundHeight } from './workedMotif';

const { stitchesPerRound } = PLAN_LIMITS;

/** A round of border from its text, as it works out. */
const edging = strict('Edging', {
  name: name('Name of the edging'),
  text: notes('Text of the edging', PLAN_LIMITS.edgingLength).min(
    1,
    'Text of the edging is missing',
  ),
  terms: choice('Terms', ['us', 'uk']),
  over: strict('Edge', {
    least: counted('Stitches an edging needs', 1, stitchesPerRound),
    multipleOf: counted('Stitches of a repeat', 1, stitchesPerRound),
  }),
  made: strict('Stitches of the edging', {
    least: stitchCounts('Stitches made', stitchesPerRound),
    perRepeat: stitchCounts('Stitches of a repeat', stitchesPerRound),
  }),
  top: strict('Top of the edging', {
    least: counted('Stitches left', 0, stitchesPerRound),
    perRepeat: counted('Stitches a repeat leaves', 0, stitchesPerRound),
  }),
  height: roundHeight,
});

const more = counted(
  'Stitches more on a side',
  -PLAN_LIMITS.borderAdjustment,
  PLAN_LIMITS.borderAdjustment,
);

/** A round of border: one stitch all round, or an edging. */
export const borderRoundSchema = strict('Border round', {
  stitch: knownStitch,
  colour: name('Key of a colour', PLAN_LIMITS.keyLength),
  edging: edging.optional(),
  adjust: z
    .tuple([more, more, more, more], { error: 'Stitches more must be given for four sides' })
    .optional(),
});

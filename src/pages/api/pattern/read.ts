import { readPattern } from '../../../lib/pattern';
import { patternReadingSchema, patternReadInput } from '../../../schemas/pattern';
import { PATTERN_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { presentReading } from '../../../server/presenters/reading';

export const POST = handle({
  summary: 'Read a pattern',
  description:
    'Anyone may ask; nothing is kept. Works the rounds of a motif as they are written and says what is wrong and where. ' +
    'Stitches are counted by their US abbreviation in either terms: made is what the hook makes, tally what the pattern counts. ' +
    'Stitches of your own, by their moves, are counted by their abbreviation. ' +
    'Line and column count from 1; begin and end of a fix are offsets in the text. A right pattern has no error and no warning.',
  who: 'anyone',
  stateless: true,
  limit: 'heavy',
  body: patternReadInput,
  response: patternReadingSchema,
  example: { body: PATTERN_EXAMPLE },
  run: ({ body: { text, stitches, ...how } }) =>
    presentReading(readPattern(text, { ...how, ownStitches: stitches })),
});

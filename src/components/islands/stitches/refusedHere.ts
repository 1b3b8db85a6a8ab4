import { ApiError } from '../../../client/api';
import { isTakenWord } from '../../../lib/pattern/terms/takenWord';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import { KEPT_LIMITS } from '../../../schemas/limits';
import type { KeptStitch } from './keptStitch';

/** Why a stitch cannot be kept beside the others, as the server would say it; null where it can. */
export function refusedHere(
  { abbreviation }: OwnStitch,
  from: KeptStitch | null,
  kept: readonly KeptStitch[],
): ApiError | null {
  if (isTakenWord(abbreviation)) return refusal(takenWords(abbreviation));
  const others = kept.filter(({ id }) => id !== from?.id);
  if (others.some((each) => each.abbreviation === abbreviation))
    return refusal(`You have “${abbreviation}” already: choose other letters`);
  if (!from && others.length >= KEPT_LIMITS.stitches)
    return refusal(`At most ${KEPT_LIMITS.stitches} stitches are kept: delete one first`);
  return null;
}

export const takenWords = (abbreviation: string): string =>
  `Patterns use “${abbreviation}” already: choose other letters`;

const refusal = (message: string): ApiError =>
  new ApiError(400, { code: 'invalid', message, fields: { abbreviation: message } });

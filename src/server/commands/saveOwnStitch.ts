import { isTakenWord } from '../../lib/pattern';
import type { OwnStitchInput } from '../../schemas/ownStitch';
import { invalid } from '../parseParts';

export function ownStitchColumns({ moves, ...stitch }: OwnStitchInput) {
  return { ...stitch, ...moves };
}

/** A word that patterns use already would no longer be read as what it means. */
export function requireFreeWord({ abbreviation }: OwnStitchInput): void {
  if (isTakenWord(abbreviation)) {
    throw invalid({ abbreviation: `Patterns use “${abbreviation}” already` });
  }
}

/** The database keeps abbreviations unique. */
export const STITCH_TAKEN = {
  abbreviation: 'You have a stitch of that abbreviation already',
};

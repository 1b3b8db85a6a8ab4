import { UniqueConstraintError } from 'sequelize';
import type { OwnStitchRow } from '../../../db/models';
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

/** The database keeps abbreviations unique; this says so beside the field. */
export async function onceByAbbreviation(saving: Promise<OwnStitchRow>): Promise<OwnStitchRow> {
  try {
    return await saving;
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    throw invalid({ abbreviation: 'You have a stitch of that abbreviation already' });
  }
}

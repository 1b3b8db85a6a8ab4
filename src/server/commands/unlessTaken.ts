import { UniqueConstraintError } from 'sequelize';
import { invalid } from '../parseParts';

/**
 * What is saved, unless the database has such a row already: that is said beside the field. The
 * refusal of a unique index is a normal outcome, and the only one that no race can slip by.
 */
export async function unlessTaken<Row>(
  saving: Promise<Row>,
  fields: Record<string, string>,
): Promise<Row> {
  try {
    return await saving;
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    throw invalid(fields);
  }
}

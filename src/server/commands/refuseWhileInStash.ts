import { ForeignKeyConstraintError } from 'sequelize';
import { AppError } from '../errors';

/** The database refuses to delete what dye lots stand on; this says so in words. */
export async function refuseWhileInStash(what: string, deletion: Promise<void>): Promise<void> {
  try {
    await deletion;
  } catch (error) {
    if (!(error instanceof ForeignKeyConstraintError)) throw error;
    throw new AppError('in-use', `This ${what} is in your stash. Remove its dye lots there first.`);
  }
}

import { AppError } from '../errors';

/**
 * Refuses a save that began from an older version of the row than the one in the database, and
 * hands back what is there now. Call it on a locked row.
 */
export async function requireVersion(
  row: { version: number },
  version: number,
  present: () => unknown,
): Promise<void> {
  if (row.version === version) return;
  throw new AppError('conflict', 'This was saved from elsewhere in the meantime.', {
    current: await present(),
  });
}

import type { CurrentUser } from '../../schemas/user';

/**
 * What a person keeps is theirs alone, whatever their role: yarns, stash, swatches, motifs,
 * blankets and shopping lists are read and changed by their owner only.
 */
export const owns = (user: CurrentUser, row: { ownerId: string }): boolean =>
  row.ownerId === user.id;

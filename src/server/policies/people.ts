import type { CurrentUser } from '../../schemas/user';

/** Administrators look after accounts: they see everyone, and set anyone's roles, their own too. */
export function mayLookAfterPeople(user: CurrentUser | null): boolean {
  return user?.roles.includes('administrator') ?? false;
}

/** Nobody may be taken from the administrators, nor leave, when no other would remain. */
export function mayLeaveAdministration(
  userId: string,
  administratorIds: readonly string[],
): boolean {
  return !administratorIds.includes(userId) || administratorIds.length > 1;
}

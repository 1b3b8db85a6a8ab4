import type { User } from '../../../db/models';
import type { Preferences } from '../../schemas/preferences';
import { ROLES, type Role } from '../../schemas/roles';
import type { Account, CurrentUser } from '../../schemas/user';

export function presentCurrentUser(row: User): CurrentUser {
  return { id: row.id, name: row.name, email: row.email, roles: rolesOf(row) };
}

export function presentPreferences(row: User): Preferences {
  return { units: row.units, terms: row.terms, theme: row.theme, currency: row.currency };
}

export function presentAccount(row: User): Account {
  return {
    ...presentCurrentUser(row),
    preferences: presentPreferences(row),
    pendingEmail: row.pendingEmail,
    version: row.version,
  };
}

/** In the order roles are listed everywhere, whatever order the rows came in. */
export function rolesOf(row: User): Role[] {
  const held = new Set((row.roleRows ?? []).map(({ role }) => role));
  return ROLES.filter((role) => held.has(role));
}

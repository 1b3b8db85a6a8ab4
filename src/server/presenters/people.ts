import type { AuditEntry, User } from '../../../db/models';
import type { Person, PresentedAuditEntry } from '../../schemas/people';
import type { Role } from '../../schemas/roles';
import { presentCurrentUser } from './user';

/** A person as an administrator sees them. */
export function presentPerson(row: User): Person {
  return {
    ...presentCurrentUser(row),
    isConfirmed: row.emailConfirmedAt !== null,
    registeredAt: row.createdAt.toISOString(),
    version: row.version,
  };
}

export function presentAuditEntry(row: AuditEntry): PresentedAuditEntry {
  return {
    id: row.id,
    action: row.action,
    actorName: row.actorName,
    subjectName: row.subjectName,
    before: row.before as Role[],
    after: row.after as Role[],
    at: row.createdAt.toISOString(),
  };
}

import { randomUUID } from 'node:crypto';
import { User, UserRole } from '../../db/models';
import type { Role } from '../../src/schemas/roles';
import { hashPassword } from '../../src/server/passwordHash';
import { presentCurrentUser } from '../../src/server/presenters/user';
import type { CurrentUser } from '../../src/schemas/user';

/** The password of every built user. */
export const PASSWORD = 'a wound skein';
const passwordHash = hashPassword(PASSWORD);

interface UserValues {
  name?: string;
  email?: string;
  roles?: readonly Role[];
  isConfirmed?: boolean;
}

/** A person in the database, confirmed and a maker unless said otherwise. */
export async function buildUserRow(values: UserValues = {}): Promise<User> {
  const { name = 'Tamsin Okafor', roles = ['maker'], isConfirmed = true } = values;
  const user = await User.create({
    name,
    email: values.email ?? `${randomUUID()}@example.com`,
    passwordHash: await passwordHash,
    emailConfirmedAt: isConfirmed ? new Date('2026-11-01T08:00:00Z') : null,
  });
  await UserRole.bulkCreate(roles.map((role) => ({ userId: user.id, role })));
  return user.reload({ include: 'roleRows' });
}

/** The same, as routes and pages know the person who is signed in. */
export async function buildUser(values: UserValues = {}): Promise<CurrentUser> {
  return presentCurrentUser(await buildUserRow(values));
}

import type { User } from '../../db/models';
import { CONTAINS_EMAIL } from '../schemas/account';
import { invalid } from './parseParts';
import { verifyPassword } from './passwordHash';
import { forgetCalls, limitCall } from './rateLimit';

/** Asks for the password again before what cannot be undone; guesses are counted. */
export async function requireOwnPassword(
  user: User,
  password: string,
  field = 'password',
): Promise<void> {
  await limitCall('password', user.id);
  if (!(await verifyPassword(password, user.passwordHash))) {
    throw invalid({ [field]: 'That is not your password.' });
  }
  await forgetCalls('password', user.id);
}

/** The form's own rule, where only the server knows the address. */
export function requireOtherThanAddress(password: string, email: string): void {
  if (password.toLowerCase().includes(email)) throw invalid({ password: CONTAINS_EMAIL });
}

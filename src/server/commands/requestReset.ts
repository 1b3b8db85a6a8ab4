import { User } from '../../../db/models';
import { issueToken } from '../emailTokens';
import { resetLetter } from '../letters';
import type { Letter } from '../mail';
import type { AccountCall } from './registerAccount';

/** The letter with the link to choose a new password, if the address has an account. */
export async function requestReset(
  email: string,
  { origin, transaction, now }: AccountCall,
): Promise<Letter | null> {
  const user = await User.findOne({ where: { email }, transaction });
  if (!user) return null;
  const token = await issueToken(user, 'reset', email, { transaction, now });
  return resetLetter(email, user.name, { origin, token });
}

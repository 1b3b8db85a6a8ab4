import { User } from '../../../db/models';
import { issueToken } from '../emailTokens';
import { confirmationLetter } from '../letters';
import type { Letter } from '../mail';
import type { AccountCall } from './registerAccount';

/** Another confirmation letter, if there is an account that waits for one. */
export async function resendConfirmation(
  email: string,
  { origin, transaction, now }: AccountCall,
): Promise<Letter | null> {
  const user = await User.findOne({ where: { email, emailConfirmedAt: null }, transaction });
  if (!user) return null;
  const token = await issueToken(user, 'confirm', email, { transaction, now });
  return confirmationLetter(email, user.name, { origin, token });
}

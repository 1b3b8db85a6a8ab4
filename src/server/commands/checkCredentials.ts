import { User } from '../../../db/models';
import { signInSchema } from '../../schemas/account';
import { verifyPassword } from '../passwordHash';
import { countCall, forgetCalls } from '../rateLimit';

export type Refusal = 'wrong' | 'unconfirmed' | 'too-many';
export type CredentialsCheck = { accepted: User } | { refused: Refusal };

/**
 * Whether an e-mail and a password sign someone in. Only the right password learns that the
 * address is still to be confirmed; all else about an account stays untold.
 */
export async function checkCredentials(
  credentials: unknown,
  address: string,
): Promise<CredentialsCheck> {
  const parsed = signInSchema.safeParse(credentials);
  if (!parsed.success) return { refused: 'wrong' };
  const { email, password } = parsed.data;
  const fromHere = `${address} ${email}`;

  const tries = [
    await countCall('sign-in', address),
    await countCall('password', fromHere),
    await countCall('password-anywhere', email),
  ];
  if (tries.some((waitS) => waitS !== null)) return { refused: 'too-many' };

  const user = await User.findOne({ where: { email } });
  const isRight = await verifyPassword(password, user?.passwordHash ?? null);
  if (!user || !isRight) return { refused: 'wrong' };
  await forgetCalls('password', fromHere);
  await forgetCalls('password-anywhere', email);
  return user.emailConfirmedAt ? { accepted: user } : { refused: 'unconfirmed' };
}

import { hash, verify } from '@node-rs/argon2';

/** argon2id as OWASP's password storage cheat sheet asks for at least: 19 MiB, 2 passes, 1 lane. */
const ARGON2ID = { algorithm: 2, memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 };

/** One password may be typed in composed or decomposed letters, depending on the keyboard. */
const normalise = (password: string) => password.normalize('NFKC');

export function hashPassword(password: string): Promise<string> {
  return hash(normalise(password), ARGON2ID);
}

let hashOfNothing: Promise<string> | undefined;

/**
 * Whether the password is the one hashed. Without a hash it works as long and answers no, so that
 * the time taken does not tell whether an account exists.
 */
export async function verifyPassword(password: string, hashed: string | null): Promise<boolean> {
  hashOfNothing ??= hashPassword('no account has this');
  const isRight = await verify(hashed ?? (await hashOfNothing), normalise(password));
  return isRight && hashed !== null;
}

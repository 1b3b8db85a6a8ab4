import { createHash, randomBytes } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import { EmailToken, type User } from '../../db/models';
import type { EmailTokenPurpose } from '../../db/models/EmailToken';
import { AppError } from './errors';

const TOKEN_BYTES = 32;
const HOUR_MS = 60 * 60 * 1000;
const LIFETIME_MS: Record<EmailTokenPurpose, number> = { confirm: 24 * HOUR_MS, reset: HOUR_MS };

interface When {
  transaction: Transaction;
  now: Date;
}

/** The token is 256 random bits, so a plain hash is as good as a slow one. */
const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

/** A new token for one link; links of the same kind sent before it stop working. */
export async function issueToken(
  user: User,
  purpose: EmailTokenPurpose,
  email: string,
  { transaction, now }: When,
): Promise<string> {
  const token = randomBytes(TOKEN_BYTES).toString('base64url');
  await EmailToken.destroy({ where: { userId: user.id, purpose }, transaction });
  await EmailToken.create(
    {
      userId: user.id,
      purpose,
      email,
      tokenHash: hashOf(token),
      createdAt: now,
      expiresAt: new Date(now.getTime() + LIFETIME_MS[purpose]),
    },
    { transaction },
  );
  return token;
}

/** Whether the link would still work, without using it. */
export async function isTokenGood(
  token: string,
  purpose: EmailTokenPurpose,
  now: Date,
): Promise<boolean> {
  return (await EmailToken.count({ where: unused(token, purpose, now) })) > 0;
}

/** Uses a token up. One statement, so that of two at once only one succeeds. */
export async function useToken(
  token: string,
  purpose: EmailTokenPurpose,
  { transaction, now }: When,
): Promise<EmailToken> {
  const [, rows] = await EmailToken.update(
    { usedAt: now },
    { where: unused(token, purpose, now), returning: true, transaction },
  );
  const [row] = rows;
  if (!row)
    throw new AppError('gone', 'This link was used already, or is too old. Ask for a new one.');
  return row;
}

function unused(token: string, purpose: EmailTokenPurpose, now: Date) {
  return { tokenHash: hashOf(token), purpose, usedAt: null, expiresAt: { [Op.gt]: now } };
}

import { describe, expect, it } from 'vitest';
import { EmailToken } from '../../../db/models';
import { buildUserRow } from '../../support/factories';

const values = {
  purpose: 'confirm' as const,
  tokenHash: 'a'.repeat(64),
  email: 'odile@example.com',
  createdAt: new Date('2026-12-01T10:00:00Z'),
  expiresAt: new Date('2026-12-02T10:00:00Z'),
};

describe('EmailToken', () => {
  it('reads each field that was written', async () => {
    const { id: userId } = await buildUserRow();
    const { id } = await EmailToken.create({ ...values, userId });
    const row = await EmailToken.findByPk(id, { rejectOnEmpty: true });
    expect(row.userId).toBe(userId);
    expect([row.purpose, row.tokenHash, row.email]).toEqual([
      'confirm',
      'a'.repeat(64),
      'odile@example.com',
    ]);
    expect(row.createdAt).toEqual(values.createdAt);
    expect(row.expiresAt).toEqual(values.expiresAt);
    expect(row.usedAt).toBeNull();
    await row.destroy();
  });

  it.each([
    ['another purpose', { purpose: 'invite' as never }],
    [
      'a token in the place of its hash',
      { tokenHash: 'Zk3v0yq8Jw2uB6nD1sXrT9fLhC5aPgQeM7iOoVbRtKU' },
    ],
    ['an end before its beginning', { expiresAt: values.createdAt }],
  ])('is refused by the database with %s', async (_, change) => {
    const { id: userId } = await buildUserRow();
    await expect(EmailToken.create({ ...values, ...change, userId })).rejects.toThrow(
      'check constraint',
    );
  });
});

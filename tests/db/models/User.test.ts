import { describe, expect, it } from 'vitest';
import { sequelize, User, UserRole } from '../../../db/models';
import { buildUserRow } from '../../support/factories';

const HASH = '$argon2id$v=19$m=19456,t=2,p=1$c2FsdA$aGFzaA';
const insert = (values: object) =>
  User.create({
    name: 'Odile',
    email: `${Math.random()}@example.com`,
    passwordHash: HASH,
    ...values,
  });

describe('User', () => {
  it('reads each field that was written', async () => {
    const { id } = await insert({
      name: 'Odile Marchetti',
      email: 'reads@example.com',
      pendingEmail: 'new@example.com',
      emailConfirmedAt: new Date('2026-12-01T10:00:00Z'),
      tokenVersion: 3,
      units: 'imperial',
      terms: 'uk',
      theme: 'dark',
      currency: 'GBP',
      version: 2,
    });
    const row = await User.findByPk(id, { rejectOnEmpty: true });
    expect(row.name).toBe('Odile Marchetti');
    expect(row.email).toBe('reads@example.com');
    expect(row.pendingEmail).toBe('new@example.com');
    expect(row.passwordHash).toBe(HASH);
    expect(row.emailConfirmedAt?.toISOString()).toBe('2026-12-01T10:00:00.000Z');
    expect(row.tokenVersion).toBe(3);
    expect([row.units, row.terms, row.theme, row.currency]).toEqual([
      'imperial',
      'uk',
      'dark',
      'GBP',
    ]);
    expect(row.version).toBe(2);
    expect(row.createdAt).toBeInstanceOf(Date);
    expect(row.updatedAt).toBeInstanceOf(Date);
  });

  it('keeps an address for one account, however it is written', async () => {
    await insert({ email: 'once@example.com' });
    await expect(insert({ email: 'once@example.com' })).rejects.toThrow('Validation error');
    await expect(
      sequelize.query(
        `insert into users (name, email, password_hash) values ('O', 'ONCE@example.com', '${HASH}')`,
      ),
    ).rejects.toThrow();
  });

  it.each([
    ['an empty name', { name: '  ' }],
    ['a name of 81 characters', { name: 'x'.repeat(81) }],
    ['capital letters in an address', { email: 'Odile@example.com' }],
    ['an address without an @', { email: 'odile' }],
    ['a password that is not hashed', { passwordHash: 'seventeen skeins' }],
    ['unknown units', { units: 'cubits' }],
    ['unknown terms', { terms: 'au' }],
    ['an unknown theme', { theme: 'sepia' }],
    ['a currency that is no code', { currency: 'euro' }],
  ])('is refused by the database with %s', async (_, values) => {
    await expect(insert(values)).rejects.toThrow('violates check constraint');
  });

  it('takes its roles along when it is deleted', async () => {
    const row = await buildUserRow({ roles: ['maker', 'teacher'] });
    await row.destroy();
    expect(await UserRole.count({ where: { userId: row.id } })).toBe(0);
  });
});

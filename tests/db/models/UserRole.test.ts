import { describe, expect, it } from 'vitest';
import { UserRole } from '../../../db/models';
import { ROLES } from '../../../src/schemas/roles';
import { buildUserRow } from '../../support/factories';

describe('UserRole', () => {
  it('takes every role there is, and reads it back', async () => {
    const { id } = await buildUserRow({ roles: ROLES });
    const rows = await UserRole.findAll({ where: { userId: id } });
    expect(rows.map(({ role }) => role).sort()).toEqual([...ROLES].sort());
  });

  it('is refused by the database for another role, and for the same one twice', async () => {
    const { id: userId } = await buildUserRow({ roles: ['maker'] });
    await expect(UserRole.create({ userId, role: 'owner' as never })).rejects.toThrow(
      'check constraint',
    );
    await expect(UserRole.create({ userId, role: 'maker' })).rejects.toThrow('Validation error');
  });
});

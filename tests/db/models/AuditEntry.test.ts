import { describe, expect, it } from 'vitest';
import { AuditEntry } from '../../../db/models';
import { buildUserRow } from '../../support/factories';

describe('AuditEntry', () => {
  it('reads each field that was written, and outlives whom it is about', async () => {
    const actor = await buildUserRow({ name: 'Ada' });
    const subject = await buildUserRow({ name: 'Bram' });
    const { id } = await AuditEntry.create({
      action: 'roles-set',
      actorId: actor.id,
      actorName: 'Ada',
      subjectId: subject.id,
      subjectName: 'Bram',
      before: ['maker'],
      after: ['maker', 'seller'],
    });
    await subject.destroy();
    const row = await AuditEntry.findByPk(id, { rejectOnEmpty: true });
    expect([row.action, row.actorId, row.actorName]).toEqual(['roles-set', actor.id, 'Ada']);
    expect([row.subjectId, row.subjectName]).toEqual([null, 'Bram']);
    expect([row.before, row.after]).toEqual([['maker'], ['maker', 'seller']]);
    expect(row.createdAt).toBeInstanceOf(Date);
  });
});

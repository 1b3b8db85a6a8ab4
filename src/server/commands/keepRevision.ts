import { Op, type Transaction } from 'sequelize';
import { BlanketRevision, type Blanket } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';

/** Writes down a blanket as it was just saved; the oldest save beyond the limit is forgotten. */
export async function keepRevision(
  { id: blanketId, version, title, plan, schemaVersion, updatedAt: savedAt }: Blanket,
  transaction: Transaction,
): Promise<void> {
  await BlanketRevision.create(
    { blanketId, version, title, plan, schemaVersion, savedAt },
    { transaction },
  );
  await BlanketRevision.destroy({
    where: { blanketId, version: { [Op.lte]: version - KEPT_LIMITS.revisionsPerBlanket } },
    transaction,
  });
}

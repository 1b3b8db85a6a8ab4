import type { Transaction } from 'sequelize';
import { sequelize } from '../../db/models';

/** Runs a command for a page that answers a form without script; routes have `handle`. */
export function inTransaction<Result>(
  command: (transaction: Transaction) => Promise<Result>,
): Promise<Result> {
  return sequelize.transaction(command);
}

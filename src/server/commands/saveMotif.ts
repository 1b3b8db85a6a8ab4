import { Op, type Transaction } from 'sequelize';
import { MotifVersion, type MotifRow } from '../../../db/models';
import { motifOf, readPattern, type Severity } from '../../lib/pattern';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { MotifInput } from '../../schemas/motif';
import { motifSchema } from '../../schemas/workedMotif';

/**
 * What is kept of a motif: its pattern, and what the reader makes of it. A text that no blanket could
 * be planned of (no round yet, rows, more rounds than a plan takes) is kept without rounds.
 */
export function motifColumns(input: MotifInput) {
  const { text, stitches: ownStitches, name } = input;
  const reading = readPattern(text, { ...input, ownStitches });
  const worked = motifSchema.safeParse(motifOf(reading, 'worked', name));
  const usable = reading.rounds.every(({ kind }) => kind === 'round') && worked.success;
  const count = (wanted: Severity): number =>
    reading.diagnostics.filter(({ severity }) => severity === wanted).length;
  return {
    ...input,
    ring: usable ? worked.data.ring : { chains: 0, made: {} },
    rounds: usable ? worked.data.rounds : [],
    errors: count('error'),
    warnings: count('warning'),
  };
}

/** Writes down a motif as it was just saved; the oldest save beyond the limit is forgotten. */
export async function keepMotifVersion(row: MotifRow, transaction: Transaction): Promise<void> {
  const {
    id: motifId,
    ownerId: _owner,
    createdAt: _made,
    updatedAt: savedAt,
    ...saved
  } = row.get();
  await MotifVersion.create({ motifId, ...saved, savedAt }, { transaction });
  await MotifVersion.destroy({
    where: { motifId, version: { [Op.lte]: row.version - KEPT_LIMITS.versionsPerMotif } },
    transaction,
  });
}

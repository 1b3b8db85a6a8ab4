import type { Transaction } from 'sequelize';
import { SwatchMeasurement, Yarn, type Swatch } from '../../../db/models';
import type { Measurement, SwatchInput } from '../../schemas/swatch';
import type { CurrentUser } from '../../schemas/user';
import { owns } from '../policies/own';
import { invalid } from '../parseParts';

export function swatchColumns(input: SwatchInput) {
  const { name, yarnId, stitch, stitches, rows, hookMm, notes } = input;
  return { name, yarnId, stitch, stitches, rows, hookMm, notes };
}

export async function requireOwnYarn(
  user: CurrentUser,
  yarnId: string | null,
  transaction: Transaction,
): Promise<void> {
  if (yarnId === null) return;
  const yarn = await Yarn.findByPk(yarnId, { transaction });
  if (!yarn || !owns(user, yarn)) throw invalid({ yarnId: 'You have no such yarn' });
}

export async function replaceMeasurements(
  { id: swatchId }: Swatch,
  measurements: Measurement[],
  transaction: Transaction,
): Promise<void> {
  await SwatchMeasurement.destroy({ where: { swatchId }, transaction });
  await SwatchMeasurement.bulkCreate(
    measurements.map((measurement, position) => ({ swatchId, position, ...measurement })),
    { transaction },
  );
}

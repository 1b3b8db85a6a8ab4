import type { Transaction } from 'sequelize';
import { Colourway, PartSkein, type DyeLot } from '../../../db/models';
import type { LotInput } from '../../schemas/stash';
import { invalid } from '../parseParts';

export function lotColumns(input: Omit<LotInput, 'colourwayId'>) {
  return {
    lotCode: input.lotCode,
    location: input.location,
    pricePaidMinor: input.pricePaid?.priceMinor ?? null,
    currency: input.pricePaid?.currency ?? null,
    wholeSkeins: input.wholeSkeins,
  };
}

/** The database keeps lot codes unique within a colourway. */
export const LOT_TAKEN = { lotCode: 'This dye lot of this colourway is in your stash already' };

/** A part skein can weigh no more than a whole one. */
export async function replacePartSkeins(
  lot: DyeLot,
  partSkeins: LotInput['partSkeins'],
  transaction: Transaction,
): Promise<void> {
  const colourway = await Colourway.findByPk(lot.colourwayId, { include: 'yarn', transaction });
  const wholeG = colourway?.yarn?.putUpMassG ?? 0;
  const tooHeavy = partSkeins.flatMap(({ massG }, index) =>
    massG > wholeG ? [[`partSkeins.${index}.massG`, `A whole skein weighs only ${wholeG} g`]] : [],
  );
  if (tooHeavy.length > 0) throw invalid(Object.fromEntries(tooHeavy));

  await PartSkein.destroy({ where: { dyeLotId: lot.id }, transaction });
  await PartSkein.bulkCreate(
    partSkeins.map(({ massG }, position) => ({ dyeLotId: lot.id, position, massG })),
    { transaction },
  );
}

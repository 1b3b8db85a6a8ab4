import type { DyeLot } from '../../../db/models';
import type { PresentedLot } from '../../schemas/stash';
import { presentMoney } from './yarn';

/** A dye lot loaded with its colourway, yarn and part skeins. */
export function presentLot(row: DyeLot): PresentedLot {
  const { colourway, partSkeins = [] } = row;
  const yarn = colourway?.yarn;
  if (!colourway || !yarn) throw new Error('a dye lot is presented with its colourway and yarn');
  const partsG = partSkeins.reduce((sum, { massG }) => sum + massG, 0);
  return {
    id: row.id,
    version: row.version,
    updatedAt: row.updatedAt.toISOString(),
    lotCode: row.lotCode,
    location: row.location,
    pricePaid: presentMoney(row.pricePaidMinor, row.currency),
    wholeSkeins: row.wholeSkeins,
    partSkeins: partSkeins.map(({ massG }) => ({ massG })),
    colourway: { id: colourway.id, name: colourway.name, hex: colourway.hex },
    yarn: {
      id: yarn.id,
      name: yarn.name,
      maker: yarn.maker,
      weightCategory: yarn.weightCategory as PresentedLot['yarn']['weightCategory'],
      putUp: { massG: yarn.putUpMassG, lengthM: yarn.putUpLengthM },
    },
    totalG: row.wholeSkeins * yarn.putUpMassG + partsG,
    totalM: row.wholeSkeins * yarn.putUpLengthM + (partsG / yarn.putUpMassG) * yarn.putUpLengthM,
  };
}

import type { Colourway, Yarn } from '../../../db/models';
import type { Money, PresentedColourway, PresentedYarn } from '../../schemas/yarn';

export function presentColourway(row: Colourway): PresentedColourway {
  return { id: row.id, yarnId: row.yarnId, version: row.version, name: row.name, hex: row.hex };
}

export function presentYarn(row: Yarn): PresentedYarn {
  return {
    id: row.id,
    version: row.version,
    updatedAt: row.updatedAt.toISOString(),
    name: row.name,
    maker: row.maker,
    fibre: row.fibre,
    weightCategory: row.weightCategory as PresentedYarn['weightCategory'],
    putUp: { massG: row.putUpMassG, lengthM: row.putUpLengthM },
    price: presentMoney(row.priceMinor, row.currency),
    colourways: (row.colourways ?? []).map(presentColourway),
  };
}

/** The database keeps both or neither. */
export function presentMoney(priceMinor: number | null, currency: string | null): Money | null {
  return priceMinor === null || currency === null
    ? null
    : { priceMinor, currency: currency as Money['currency'] };
}

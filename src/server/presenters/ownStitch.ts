import type { OwnStitchRow } from '../../../db/models';
import type { PresentedOwnStitch } from '../../schemas/ownStitch';

export function presentOwnStitch(row: OwnStitchRow): PresentedOwnStitch {
  const { id, version, abbreviation, name, wraps, draws, throughs } = row;
  return {
    id,
    version,
    updatedAt: row.updatedAt.toISOString(),
    abbreviation,
    name,
    moves: { wraps, draws, throughs },
    heightOverWidth: row.heightOverWidth,
    takes: row.takes,
    symbol: row.symbol,
  };
}
